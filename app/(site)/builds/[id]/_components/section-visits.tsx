// The links by which a section was shown to somebody, and the form for another.
import { VisitForm } from '@/components/builds/visit-form'
import { RivetLine } from '@/components/layout/rivet-line'
import { DateText } from '@/components/ui/date-text'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { paths } from '@/lib/paths'
import type { VisitLink } from '@/lib/services/builds/list-visits'
import { makeVisitAction, revokeVisitAction } from '../../visit-actions'

export function SectionVisits({ buildId, section, visits }: { buildId: number; section: string; visits: readonly VisitLink[] }) {
  return (
    <section className="grid gap-4" aria-labelledby="visits">
      <RivetLine title="Visit sheet" id="visits" note="for a mentor or an inspector" />
      <p className="max-w-text">Shows this section: what you did, go by and hold. Not the serial, not who helped. On paper, or by a link where they write what they find; each finding becomes a hold.</p>
      {visits.length > 0 ? (
        <ul className="sheet max-w-2xl divide-y divide-line">
          {visits.map((visit) => (
            <li key={visit.id} className="flex flex-wrap items-center justify-between gap-3 px-5 py-3">
              <span><b>{visit.visitor}</b> <span className="text-small text-ink-soft">{visit.findings} found · {visit.state === 'open' ? <>open until <DateText at={visit.expiresAt} /></> : visit.state === 'expired' ? <>expired on <DateText at={visit.expiresAt} /></> : 'revoked'}</span></span>
              {visit.state === 'open' ? <FieldsForm action={revokeVisitAction} id={`revoke-${visit.id}`} hidden={{ buildId, visitId: visit.id }} fields={[]} button={`Revoke the link of ${visit.visitor}`} look="quiet" /> : null}
            </li>
          ))}
        </ul>
      ) : null}
      <div className="button-row"><LinkButton href={paths.visitSheet(buildId, section)}>Print the sheet</LinkButton></div>
      <Disclosure summary="Share it by a link"><VisitForm action={makeVisitAction} buildId={buildId} section={section} /></Disclosure>
    </section>
  )
}
