// A hold of one's own with what can be done: release it with a note, print its tag.
import { HoldCard } from '@/components/builds/hold-card'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { paths } from '@/lib/paths'
import type { Hold } from '@/lib/schemas/builds'
import { releaseHoldAction } from '../../actions'

export interface HoldWithReleaseProps {
  hold: Hold
  withSection?: boolean
  level?: 2 | 3
  /** Where to go after it was released; its section when not given. */
  returnTo?: string
  /** The form stands open, as on the page that the tag's code opens. */
  open?: boolean
}

export function HoldWithRelease({ hold, withSection = false, level = 3, returnTo = '', open = false }: HoldWithReleaseProps) {
  if (hold.released) return <HoldCard hold={hold} withSection={withSection} level={level} />
  return (
    <HoldCard hold={hold} withSection={withSection} level={level}>
      <Disclosure small open={open} summary={<>Release<span className="sr-only"> {hold.number}</span></>}>
        <FieldsForm action={releaseHoldAction} id={`release-${hold.id}`} hidden={{ buildId: hold.buildId, holdId: hold.id, returnTo }} button={`Release ${hold.number}`} look="primary"
          fields={[{ name: 'note', label: 'What released it', kind: 'area', maxLength: 1000, help: 'Who said so, when, what you found.' }]} />
      </Disclosure>
      <LinkButton small look="quiet" className="justify-self-start" href={paths.holdTags(hold.buildId, hold.id)}>Print its tag<span className="sr-only">, {hold.number}</span></LinkButton>
    </HoldCard>
  )
}
