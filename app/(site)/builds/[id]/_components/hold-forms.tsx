// The two forms of a hold: do not go past; and left open on purpose until another section.
import { randomUUID } from 'node:crypto'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldsForm, type FormField } from '@/components/ui/fields-form'
import { addHoldAction } from '../../actions'

const place: readonly FormField[] = [
  { name: 'page', label: 'Plans page', maxLength: 40, autoComplete: 'off', optional: true, placeholder: 'W3-2' },
  { name: 'step', label: 'Step', maxLength: 40, autoComplete: 'off', optional: true },
]

export interface HoldFormsProps { buildId: number; section: string; sections: readonly { code: string; title: string }[] }

export function HoldForms({ buildId, section, sections }: HoldFormsProps) {
  const others = sections.filter((s) => s.code !== section)
  return (
    <div className="grid gap-3">
      <Disclosure summary="Make a hold">
        <FieldsForm action={addHoldAction} id="hold" hidden={{ buildId, section, kind: 'hold', key: randomUUID() }} button="Hang up the hold" look="primary" fields={[
          { name: 'what', label: 'Do not go past', maxLength: 200, autoComplete: 'off', help: 'The part, the side, and what must not be done: rib 7, hole 3, left wing: do not rivet.' },
          { name: 'until', label: 'Until', maxLength: 200, autoComplete: 'off', help: 'What releases it: the kit maker’s written reply, two stamps, a part that comes.' },
          ...place,
          { name: 'notWaiting', label: 'What need not wait', maxLength: 200, autoComplete: 'off', optional: true, help: 'Steps that you can go on with meanwhile.' },
        ]} />
      </Disclosure>
      <Disclosure summary="Leave something open on purpose">
        <FieldsForm action={addHoldAction} id="left-open" hidden={{ buildId, section, kind: 'left-open', key: randomUUID() }} button="Leave it open" look="primary" fields={[
          { name: 'what', label: 'What stays open', maxLength: 200, autoComplete: 'off', help: 'Such as: rib 12, last two holes, clecoed only.' },
          { name: 'untilSection', label: 'Until section', kind: 'select', options: [{ value: '', label: 'Choose a section' }, ...others.map((s) => ({ value: s.code, label: `${s.code} ${s.title}` }))], help: 'It shows there until you release it.' },
          ...place,
        ]} />
      </Disclosure>
    </div>
  )
}
