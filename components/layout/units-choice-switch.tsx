// Which units stand first on this device: a form of three buttons, so that it works without JavaScript and the server draws what it says.
import { unitsChoices, type UnitsChoice } from '@/lib/format/units-choice'

/** `action` keeps `units`; the page one is on comes back. */
export function UnitsChoiceSwitch({ action, chosen }: { action: (form: FormData) => Promise<void>; chosen: UnitsChoice }) {
  return (
    <form action={action} className="page-switch units-choice">
      <span className="label" id="units-choice-label">Units</span>
      <div className="page-switch-row" role="group" aria-labelledby="units-choice-label">
        {unitsChoices.map(({ value, label }) => <button key={value} type="submit" name="units" value={value} aria-pressed={value === chosen}>{label}</button>)}
      </div>
    </form>
  )
}
