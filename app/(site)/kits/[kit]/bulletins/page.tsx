// The bulletins of a kit: number, date, serials, pages and steps, and one line of our own words. Stewards enter them here.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { TitleBlock } from '@/components/entries/title-block'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import { getBulletins } from '@/lib/services/plans/get-bulletins'
import { bulletinAction } from '../../actions'
import { atKit } from './at-kit'

export const metadata: Metadata = { title: 'Bulletins' }

type Bulletins = Awaited<ReturnType<typeof getBulletins>>

export default async function BulletinsPage({ params }: PageProps<'/kits/[kit]/bulletins'>) {
  const context = await pageContext()
  const { kit, bulletins, mayKeep } = await atKit(params, (slug) => getBulletins(context, slug))
  return (
    <>
      <PageTitle kicker={kit.name} title="Bulletins" lead={`${kit.maker}’s changes to the plans, each in one line of our own words. Get the bulletin itself from the kit maker.`} aside={<LinkButton href={paths.kit(kit.slug)}>Sections</LinkButton>} />
      {bulletins.length === 0 ? <EmptyState title="No bulletin entered yet">Whether there is one, the kit maker knows: ask before you begin.</EmptyState> : bulletins.map((b) => <BulletinSheet key={b.id} bulletin={b} />)}
      {mayKeep ? <EnterBulletin kit={kit.slug} count={bulletins.length} /> : null}
    </>
  )
}

function BulletinSheet({ bulletin: b }: { bulletin: Bulletins['bulletins'][number] }) {
  return (
    <Sheet as="section" id={b.number} labelledBy={`bulletin-${b.id}`}>
      <SheetHead id={`bulletin-${b.id}`} title={`Bulletin ${b.number}`} note={`entered ${formatDate(b.createdAt)}`} />
      <div className="sheet-body">
        <p>{b.summary}</p>
        <ul className="grid gap-1">{b.steps.map((s) => <li key={`${s.page} ${s.step ?? ''}`} className="code">Page {s.page}{s.step ? ` step ${s.step}` : ', whole page'}{s.revision ? ` · Rev ${s.revision}` : ''}</li>)}</ul>
      </div>
      <TitleBlock cells={[{ label: 'Dated', value: formatDate(b.issuedOn) }, { label: 'Serials', value: b.serials, width: 'long' }]} />
    </Sheet>
  )
}

/** The key empties the form once a bulletin stands. */
function EnterBulletin({ kit, count }: { kit: string; count: number }) {
  return (
    <Sheet as="section" labelledBy="enter-bulletin">
      <SheetHead id="enter-bulletin" title="Enter a bulletin" note="takes effect at once" />
      <div className="sheet-body">
        <p>Stamps on these pages and steps become <b>plans changed</b> until a mentor looks again, and everybody who goes by such advice is told.</p>
        <FieldsForm key={count} action={bulletinAction} id="bulletin" hidden={{ kit, submission: randomUUID() }} button="Enter the bulletin" look="primary" fields={[
          { name: 'number', label: 'Number', maxLength: 30, placeholder: 'SB-3', autoComplete: 'off' },
          { name: 'issuedOn', label: 'Date printed on it', kind: 'date' },
          { name: 'serials', label: 'Serials', maxLength: 120, placeholder: 'all, or 12 to 48', autoComplete: 'off' },
          { name: 'summary', label: 'What it changes, in one line of our own words', kind: 'area', maxLength: 300 },
          { name: 'steps', label: 'Pages and steps, one a line', kind: 'area', rows: 4, placeholder: 'W3-2, 6, D', help: 'Page, step, revision of the page that carries the change. Without a step it is the whole page: W3-2, , D.' },
        ]} />
      </div>
    </Sheet>
  )
}
