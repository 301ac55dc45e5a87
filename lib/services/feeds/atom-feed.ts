// Newest entries as an Atom feed (RFC 4287). Each carries its cautions in title and content: they travel here too.
import 'server-only'
import { listEntryIds, type EntryFilters } from '@/db/queries/entries'
import type { AppContext } from '@/lib/context'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import type { Entry } from '@/lib/schemas/post'
import { loadEntries } from '@/lib/services/entries/list-entries'

interface FeedPlace { title: string; /** Absolute address of the page the feed is of. */ page: string; /** Absolute address of the feed. */ self: string; baseUrl: string }

/** XML of the 30 newest entries that fit. */
export async function atomFeed(context: AppContext, filters: EntryFilters, place: FeedPlace): Promise<string> {
  const entries = await loadEntries(context, await listEntryIds(context.reader, filters, { limit: 30, offset: 0 }))
  const updated = entries.map((e) => e.updatedAt).sort().at(-1) ?? new Date(context.now).toISOString()
  return [
    '<?xml version="1.0" encoding="utf-8"?>', '<feed xmlns="http://www.w3.org/2005/Atom">',
    `<title>${escapeXml(place.title)}</title>`, `<id>${escapeXml(place.self)}</id>`, `<updated>${updated}</updated>`,
    `<link rel="self" href="${escapeXml(place.self)}"/>`, `<link rel="alternate" href="${escapeXml(place.page)}"/>`,
    ...entries.map((entry) => feedEntry(entry, place.baseUrl)), '</feed>',
  ].join('\n')
}

function feedEntry(entry: Entry, baseUrl: string): string {
  const cautions = unionCautions([entry.cautions]).filter((c) => !c.waived)
  const worst = cautions[0]
  const address = escapeXml(`${baseUrl}${entry.url}`)
  const lines = cautions.map((c) => `<p><strong>${c.signalWord}</strong> ${escapeXml(c.title)}. ${escapeXml(c.text)}</p>`).join('')
  const html = `${lines}${entry.html.replace(hiddenForm, '')}<p>The plans win: the kit maker’s current plans and bulletins, your authority’s rules and a licensed mechanic come first.</p>`
  return [
    '<entry>', `<title>${escapeXml(worst ? `${worst.signalWord} ${worst.title}: ${entry.title}` : entry.title)}</title>`, `<id>${address}</id>`, `<link href="${address}"/>`,
    `<published>${entry.createdAt}</published>`, `<updated>${entry.updatedAt}</updated>`, `<author><name>${escapeXml(entry.author.name)}</name></author>`,
    `<content type="html">${escapeXml(html)}</content>`, '</entry>',
  ].join('\n')
}

/** The form of a measurement that our style sheet may show instead: readers that drop attributes would show both. */
const hiddenForm = /<span class="measure-lead" hidden>[^<]*<\/span>/g

/** Text for XML 1.0, which knows five entities and forbids most control characters. */
function escapeXml(text: string): string {
  return text.replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g, '').replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;').replaceAll('"', '&quot;')
}
