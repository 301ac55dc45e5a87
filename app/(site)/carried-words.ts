// Words carried over in an address: from a search that found nothing, or from a section's page, into the writing form.
import type { FormValues } from '@/lib/client/form-values'

/** First values for the form: title, and the section when kit and section are given. */
export function carriedWords(given: Record<string, string | string[] | undefined>): FormValues {
  const text = (name: string) => { const v = given[name]; return typeof v === 'string' ? v.slice(0, 160) : '' }
  const [kit, section] = [text('kit'), text('section')]
  return { title: text('title'), place: kit && section ? `${kit}/${section}` : '' }
}
