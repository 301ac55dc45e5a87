// Rendered member text. It trusts its caller: the HTML has been made and sanitised by lib/content, never typed by hand or taken from a request.

export interface ProseProps {
  /** Sanitised HTML. */
  html: string
  small?: boolean
}

export function Prose({ html, small = false }: ProseProps) {
  return <div className={small ? 'prose prose-small' : 'prose'} dangerouslySetInnerHTML={{ __html: html }} />
}
