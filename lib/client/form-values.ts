// A form's fields by name, the way the server sends them back: a field that repeats is a list.

export type FormValues = Record<string, string | string[]>

/** Hidden bookkeeping stays out: it belongs to the page that was loaded, not to what was written. */
const bookkeeping = new Set(['submission', 'revision', 'acknowledged'])

export function formValues(form: HTMLFormElement): FormValues {
  const data = new FormData(form)
  const values: FormValues = {}
  for (const name of new Set(data.keys())) {
    if (name.startsWith('$ACTION') || bookkeeping.has(name)) continue
    const all = data.getAll(name).filter((v): v is string => typeof v === 'string')
    values[name] = all.length > 1 ? all : (all[0] ?? '')
  }
  return values
}

/** A field's single value. */
export const one = (values: FormValues, name: string): string => { const v = values[name]; return v === undefined ? '' : typeof v === 'string' ? v : (v[0] ?? '') }
/** A field's values as a list. */
export const many = (values: FormValues, name: string): string[] => { const v = values[name]; return v === undefined ? [] : typeof v === 'string' ? [v] : v }
