// Results that say the same, together: one value with all who give it. Values that differ stay apart.
import type { ShopAnswerResult } from '@/lib/schemas/shop'

/** Groups in the order in which their values first come. */
export function groupReadings(results: readonly ShopAnswerResult[]): ShopAnswerResult[][] {
  const sameAs = ({ name, display }: ShopAnswerResult): string => JSON.stringify([name, display.inch])
  return [...new Set(results.map(sameAs))].map((key) => results.filter((result) => sameAs(result) === key))
}
