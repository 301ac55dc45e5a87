// axe-core in the page under test: what keeps somebody from reading or using it.
import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { AxeResults } from 'axe-core'
import type { Page } from 'playwright-core'

const source = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')

/** One line a violation: rule, what it is about, where. All rules, or only those named. */
export async function violations(page: Page, rules?: readonly string[]): Promise<string[]> {
  // As evaluated code, not as a script element: the page's content security policy would refuse that one.
  await page.evaluate(source)
  const results = await page.evaluate((only) => {
    const { axe } = window as unknown as { axe: { run(options: object): Promise<AxeResults> } }
    return axe.run({ resultTypes: ['violations'], ...(only ? { runOnly: [...only] } : {}) })
  }, rules)
  return results.violations.flatMap((v) => v.nodes.map((node) => `${v.id} (${v.impact}): ${v.help}: ${node.target.join(' ')} ${node.html.slice(0, 160)} ${node.any.map((c) => c.message).join('; ').slice(0, 200)}`))
}
