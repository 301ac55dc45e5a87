// The filters of the results page, as a form that works without JavaScript. With it, a change goes at once (auto-submit.tsx).
import type { SearchAddress } from '@/lib/paths'
import { paths } from '@/lib/paths'
import { AutoSubmit } from './auto-submit'

export interface Places {
  kits: { slug: string; name: string; sections: { code: string; title: string }[] }[]
  operations: { slug: string; title: string }[]
}

export function SearchFilters({ address, places }: { address: SearchAddress; places: Places }) {
  const place = address.kit ? `${address.kit}/${address.section ?? ''}` : ''
  return (
    <form action={paths.search()} method="get" className="filters" aria-label="Filters" id="filters">
      {address.q ? <input type="hidden" name="q" value={address.q} /> : null}
      <Choice id="place" label="Kit and section" value={place} empty="All kits">
        {places.kits.map((kit) => (
          <optgroup key={kit.slug} label={kit.name}>
            <option value={`${kit.slug}/`}>{kit.name}: all sections</option>
            {kit.sections.map((s) => <option key={s.code} value={`${kit.slug}/${s.code}`}>{s.code} {s.title}</option>)}
          </optgroup>
        ))}
      </Choice>
      <Choice id="operation" label="Operation" value={address.operation ?? ''} empty="All operations">
        {places.operations.map((o) => <option key={o.slug} value={o.slug}>{o.title}</option>)}
      </Choice>
      <Choice id="kind" label="Kind" value={address.kind ?? ''} empty="Questions and lessons">
        <option value="question">Questions</option>
        <option value="lesson">Lessons</option>
      </Choice>
      <label className="filter-check"><input type="checkbox" name="stamped" value="1" defaultChecked={address.stamped === '1'} /> Stamped</label>
      <AutoSubmit formId="filters" label="Filter" />
    </form>
  )
}

function Choice({ id, label, value, empty, children }: { id: string; label: string; value: string; empty: string; children: React.ReactNode }) {
  return (
    <label className="filter" htmlFor={`filter-${id}`}>
      <span className="label">{label}</span>
      <select id={`filter-${id}`} name={id} defaultValue={value} key={value} className="control">
        <option value="">{empty}</option>
        {children}
      </select>
    </label>
  )
}
