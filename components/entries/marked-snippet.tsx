// A plain snippet with the words that were found set apart.
import { markedText } from '@/lib/format/marked-text'

export function MarkedSnippet({ text, marks }: { text: string, marks: readonly (readonly [number, number])[] }) {
  return <>{markedText(text, marks).map((part, index) => part.marked ? <mark key={index}>{part.text}</mark> : <span key={index}>{part.text}</span>)}</>
}
