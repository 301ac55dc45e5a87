// Which system stands first where a measurement is shown, as readers choose it: on a page for this device, in their account for all.

export type UnitsChoice = 'written' | 'inch' | 'metric'

export const unitsChoices: readonly { readonly value: UnitsChoice; readonly label: string; readonly help: string }[] = [
  { value: 'written', label: 'As written', help: 'Each text in its author’s units, the other system behind it.' },
  { value: 'inch', label: 'Inch first', help: 'What was written in millimetres stands right behind.' },
  { value: 'metric', label: 'mm first', help: 'What was written in inches, and each drill’s name, stands right behind.' },
]

/** Null for anything else, and for nothing. */
export const unitsChoiceOf = (value: string | null | undefined): UnitsChoice | null => unitsChoices.find((choice) => choice.value === value)?.value ?? null

/** For what is computed and was written by nobody: inches, as the plans are drawn. */
export const firstSystem = (choice: UnitsChoice): 'inch' | 'metric' => (choice === 'metric' ? 'metric' : 'inch')
