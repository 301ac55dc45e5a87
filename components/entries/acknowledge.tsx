// The cautions that will stand on the text, each to be read and acknowledged. They cannot be removed here.
import { CautionWord } from '@/components/cautions/caution-word'
import type { Caution } from '@/lib/schemas/post'

export function Acknowledge({ cautions, acknowledged }: { cautions: readonly Caution[]; acknowledged: readonly string[] }) {
  if (cautions.length === 0) return null
  return (
    <fieldset className="acknowledge" id="acknowledge" tabIndex={-1}>
      <legend>These cautions will stand on it. Read each, then tick it.</legend>
      {cautions.map((c) => (
        <label key={c.code} className="choice choice-boxed" id={`acknowledge-${c.code}`}>
          <input type="checkbox" name="acknowledged" value={c.code} defaultChecked={acknowledged.includes(c.code)} />
          <span><CautionWord word={c.signalWord} /> <b>{c.title}.</b> {c.text} <span className="choice-help">Because of {c.because}.</span></span>
        </label>
      ))}
    </fieldset>
  )
}
