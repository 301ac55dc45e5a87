'use client'
// Where a text belongs: section, tasks, plans reference, hardware, order advice. Native fields, so that they work without JavaScript.
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldError } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { TextField } from '@/components/ui/text-field'
import { many, one, type FormValues } from '@/lib/client/form-values'

export interface FormPlaces {
  kits: { slug: string; name: string; sections: { code: string; title: string }[] }[]
  operations: { slug: string; title: string; tasks: { slug: string; title: string }[] }[]
  /** Names of hardware used before, for completion. */
  hardware: string[]
}
interface FieldsProps { places: FormPlaces; values: FormValues; error?: string | undefined }

function SectionOptions({ places }: { places: FormPlaces }) {
  return places.kits.map((kit) => (
    <optgroup key={kit.slug} label={kit.name}>
      {kit.sections.map((s) => <option key={s.code} value={`${kit.slug}/${s.code}`}>{s.code} {s.title}</option>)}
    </optgroup>
  ))
}

export function PlaceFields({ places, values, error }: FieldsProps) {
  return (
    <>
      <Select id="place" name="place" label="Kit and section" required defaultValue={one(values, 'place')} error={error}>
        <option value="">Pick the section</option>
        <SectionOptions places={places} />
      </Select>
      <Select id="also" name="also" label="Also belongs to" optional defaultValue={one(values, 'also')} help="Another section of the same kit.">
        <option value="">No other section</option>
        <SectionOptions places={places} />
      </Select>
      {many(values, 'more').map((code) => <input key={code} type="hidden" name="more" value={code} />)}
    </>
  )
}

export function TaskFields({ places, values, error }: FieldsProps) {
  const chosen = many(values, 'task').filter(Boolean)
  const [picked, setPicked] = useState(chosen)
  const titles = places.operations.flatMap((o) => o.tasks).filter((t) => picked.includes(t.slug)).map((t) => t.title)
  return (
    <div className="field" id="tasks" tabIndex={-1}>
      <span className="field-label">Tasks</span>
      <FieldError id="tasks" error={error} />
      <Disclosure summary={titles.length ? titles.join(', ') : 'Pick the tasks'} open={chosen.length > 0}>
        <div className="task-picker" onChange={(e) => setPicked(new FormData((e.target as HTMLInputElement).form ?? undefined).getAll('task').map(String))}>
          {places.operations.map((o) => (
            <fieldset key={o.slug}>
              <legend className="label">{o.title}</legend>
              {o.tasks.map((t) => <Checkbox key={t.slug} name="task" value={t.slug} label={t.title} defaultChecked={chosen.includes(t.slug)} />)}
            </fieldset>
          ))}
        </div>
      </Disclosure>
    </div>
  )
}

export function PlansFields({ values, error }: { values: FormValues; error?: string | undefined }) {
  const pages = many(values, 'planPage')
  const [rows, setRows] = useState(Math.max(1, pages.length))
  return (
    <fieldset className="field plain-fieldset" id="plans" tabIndex={-1}>
      <legend className="field-label">Plans <span className="field-optional">(page, step, revision)</span></legend>
      <FieldError id="plans" error={error} />
      {Array.from({ length: rows }, (_, i) => (
        <div className="field-row" key={i}>
          <TextField id={`plan-page-${i}`} name="planPage" label="Page" maxLength={40} defaultValue={pages[i] ?? ''} placeholder="W3-2" />
          <TextField id={`plan-step-${i}`} name="planStep" label="Step" maxLength={20} defaultValue={many(values, 'planStep')[i] ?? ''} placeholder="6" />
          <TextField id={`plan-revision-${i}`} name="planRevision" label="Plans Rev" maxLength={20} defaultValue={many(values, 'planRevision')[i] ?? ''} placeholder="C" />
        </div>
      ))}
      {rows < 6 ? <Button look="quiet" small className="needs-script" onClick={() => setRows(rows + 1)}>Another page</Button> : null}
    </fieldset>
  )
}

export function HardwareFields({ places, values, error }: FieldsProps) {
  const given = many(values, 'hardware').filter(Boolean)
  const [rows, setRows] = useState(Math.max(2, given.length + 1))
  return (
    <fieldset className="field plain-fieldset">
      <legend className="field-label">Hardware <span className="field-optional">(optional)</span></legend>
      <FieldError id="hardware" error={error} />
      {Array.from({ length: rows }, (_, i) => (
        <input key={i} id={`hardware-${i}`} className="control" name="hardware" list="known-hardware" maxLength={80} aria-label={`Hardware ${i + 1}`} defaultValue={given[i] ?? ''} placeholder={i === 0 ? 'AN470AD4-6' : undefined} />
      ))}
      <datalist id="known-hardware">{places.hardware.map((name) => <option key={name} value={name} />)}</datalist>
      {rows < 12 ? <Button look="quiet" small className="needs-script" onClick={() => setRows(rows + 1)}>Another piece</Button> : null}
    </fieldset>
  )
}

export function OrderAdviceFields({ places, values, error }: FieldsProps) {
  const before = many(values, 'before')
  const after = many(values, 'after')
  const [rows, setRows] = useState(Math.max(1, before.length))
  const options = places.operations.flatMap((o) => o.tasks).map((t) => <option key={t.slug} value={t.slug}>{t.title}</option>)
  return (
    <fieldset className="field plain-fieldset" id="order-advice" tabIndex={-1}>
      <legend className="field-label">Order advice <span className="field-optional">(optional)</span></legend>
      <FieldError id="order-advice" error={error} />
      {Array.from({ length: rows }, (_, i) => (
        <div className="field-row" key={i}>
          <Select id={`before-${i}`} name="before" label="Do this" defaultValue={before[i] ?? ''}><option value="">No advice</option>{options}</Select>
          <Select id={`after-${i}`} name="after" label="before that" defaultValue={after[i] ?? ''}><option value="">No advice</option>{options}</Select>
        </div>
      ))}
      {rows < 6 ? <Button look="quiet" small className="needs-script" onClick={() => setRows(rows + 1)}>More order advice</Button> : null}
    </fieldset>
  )
}
