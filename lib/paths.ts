// Every address of the product, typed. Nobody else puts slashes together.
import type { Route } from 'next'

const query = (values: Record<string, string | number | undefined>): string => {
  const params = new URLSearchParams()
  for (const [key, value] of Object.entries(values)) if (value !== undefined && value !== '') params.set(key, String(value))
  const text = params.toString()
  return text ? `?${text}` : ''
}

export interface SearchAddress { q?: string | undefined; kit?: string | undefined; section?: string | undefined; operation?: string | undefined; kind?: string | undefined; stamped?: '1' | undefined; offset?: number | undefined }

export const paths = {
  home: '/' as Route,
  search: (address: SearchAddress = {}) => `/search${query({ ...address })}` as Route,
  explainSearch: (address: SearchAddress = {}) => `/search/explain${query({ ...address })}` as Route,
  entry: (id: number, anchor?: number) => `/entries/${id}${anchor && anchor !== id ? `#post-${anchor}` : ''}` as Route,
  remark: (entryId: number, remarkId: number) => `/entries/${entryId}#remark-${remarkId}` as Route,
  entryPrint: (id: number) => `/entries/${id}/print` as Route,
  editEntry: (id: number) => `/entries/${id}/edit` as Route,
  revisions: (postId: number, from?: string, to?: string) => `/posts/${postId}/revisions${query({ from, to })}` as Route,
  editAnswer: (id: number) => `/answers/${id}/edit` as Route,
  ask: (words: { title?: string; kit?: string; section?: string } = {}) => `/ask${query(words)}` as Route,
  lesson: (words: { title?: string; kit?: string; section?: string } = {}) => `/lesson${query(words)}` as Route,
  shop: '/shop' as Route,
  shopTable: (slug: string, inputs: Record<string, string> = {}) => `/shop/${slug}${query(inputs)}` as Route,
  drillChart: '/shop/drills/chart' as Route,
  kits: '/kits' as Route,
  kit: (slug: string) => `/kits/${slug}` as Route,
  kitLimits: (slug: string, address: { of?: string } = {}, anchor?: string) => `/kits/${slug}/limits${query(address)}${anchor ? `#${anchor}` : ''}` as Route,
  section: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}` as Route,
  brief: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}/brief` as Route,
  briefPrint: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}/brief/print` as Route,
  planSteps: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}/plans` as Route,
  sectionLists: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}/lists` as Route,
  bulletins: (kit: string, number?: string) => `/kits/${kit}/bulletins${number === undefined ? '' : `#${encodeURIComponent(number)}`}` as Route,
  waiting: '/waiting' as Route,
  sectionFeed: (kit: string, code: string) => `/kits/${kit}/${encodeURIComponent(code)}/feed.atom` as Route,
  feed: '/feed.atom' as Route,
  builds: '/builds' as Route,
  build: (id: number) => `/builds/${id}` as Route,
  buildSection: (id: number, code: string, anchor = '') => `/builds/${id}/${encodeURIComponent(code)}${anchor && `#${anchor}`}` as Route,
  changeLogLine: (id: number, code: string, line: number) => `/builds/${id}/${encodeURIComponent(code)}?change=${line}#line-${line}` as Route,
  holdTags: (buildId: number, hold?: number) => `/builds/${buildId}/tags${query({ hold })}` as Route,
  hold: (code: string) => `/holds/${code}` as Route,
  visitSheet: (id: number, code: string) => `/builds/${id}/${encodeURIComponent(code)}/visit` as Route,
  visit: (token: string) => `/visits/${token}` as Route,
  desk: (address: { open?: number; operation?: string; section?: string } = {}) => `/desk${query(address)}` as Route,
  evidence: '/desk/evidence' as Route,
  signIn: (from?: string) => `/sign-in${query({ from })}` as Route,
  signUp: (from?: string) => `/sign-up${query({ from })}` as Route,
  account: '/account' as Route,
  people: (open?: number) => `/people${query({ open })}` as Route,
  person: (id: number) => `/people/${id}` as Route,
  guide: (slug: string) => `/guide/${slug}` as Route,
}
