// The parts of a question and of a lesson: their order, their labels, and the text they make together. Pure.

export const questionParts = [['doing', 'Doing'], ['plansSay', 'Plans say'], ['measured', 'Measured'], ['tried', 'Tried']] as const
export const lessonParts = [['happened', 'What happened'], ['differently', 'What I would do differently'], ['tools', 'Tools that helped']] as const

export type PartsValue = Record<string, string | number> | null

/** The text fields of a revision that say something, in the order they are read: parts by name, or `body`. */
export function textFields(kind: 'question' | 'lesson' | 'answer', parts: PartsValue, body: string): { name: string; label: string; text: string }[] {
  const order = kind === 'question' ? questionParts : kind === 'lesson' ? lessonParts : []
  const fields = order.flatMap(([name, label]) => {
    const text = parts?.[name]
    return typeof text === 'string' && text !== '' ? [{ name, label, text }] : []
  })
  return body === '' ? fields : [...fields, { name: 'body', label: '', text: body }]
}

/** All that was written, as one text: what cautions are judged by. */
export function wholeText(kind: 'question' | 'lesson' | 'answer', parts: PartsValue, body: string): string {
  return textFields(kind, parts, body).map((f) => f.text).join('\n\n')
}
