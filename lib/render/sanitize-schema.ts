// The only elements and attributes that user text may put on a page. Everything else is dropped.
import { defaultSchema, type Options } from 'rehype-sanitize'

/**
 * The schema of rehype-sanitize for GFM, cut down to what Markdown itself can write: no images (a remote
 * image tells its host who reads, and a picture without a scale is no evidence), no ids or names (two
 * posts on a page would clash, and `name` can shadow globals), links to http, https, mailto or within
 * this installation only.
 */
export const sanitizeSchema: Options = {
  ...defaultSchema,
  tagNames: [
    'a', 'blockquote', 'br', 'code', 'del', 'em', 'h1', 'h2', 'h3', 'h4', 'h5', 'h6', 'hr', 'input', 'li', 'ol', 'p', 'pre',
    'strong', 'table', 'tbody', 'td', 'th', 'thead', 'tr', 'ul',
  ],
  attributes: {
    a: ['href', 'title'],
    // Characters of markup are legal inside an attribute, but no later reader of the HTML should have to know that.
    code: [['className', /^language-[^<>"'&]+$/]],
    input: [['disabled', true], ['type', 'checkbox'], 'checked'],
    li: [['className', 'task-list-item']],
    ol: ['start', ['className', 'contains-task-list']],
    ul: [['className', 'contains-task-list']],
    td: ['align'],
    th: ['align'],
  },
  // Compared letter by letter; phones begin a line with a capital.
  protocols: { href: ['http', 'https', 'mailto', 'Http', 'Https', 'Mailto', 'HTTP', 'HTTPS', 'MAILTO'] },
  required: { input: { disabled: true, type: 'checkbox' } },
  clobber: [],
  strip: ['script', 'style', 'iframe', 'svg', 'math', 'template'],
}
