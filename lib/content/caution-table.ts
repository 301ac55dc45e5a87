// Reads content/cautions.json once and refuses a table that could not do its work. The rules are data; how they match is lib/domain/cautions.
import 'server-only'
import { z } from 'zod'
import data from '@/content/cautions.json'
import { EMBEDDED_WORDS, wordCount } from '@/lib/domain/cautions/group-cautions'
import { CAUTION_TOPICS, CRITICAL_TOPICS, SIGNAL_WORDS, type CautionRuleTable } from '@/lib/domain/cautions/rule-table'

const terms = z.array(z.string().trim().min(1)).min(1)

const cautionSchema = z.strictObject({
  code: z.string().regex(/^[a-z]+(-[a-z]+)*$/),
  signalWord: z.enum(SIGNAL_WORDS),
  topic: z.enum(CAUTION_TOPICS),
  title: z.string().min(1),
  text: z.string().min(1),
  short: z.string().min(1).refine((short) => wordCount(short) <= EMBEDDED_WORDS, `at most ${EMBEDDED_WORDS} words`),
  twoStamps: z.boolean(),
})

const ruleSchema = z.strictObject({
  code: z.string(),
  operations: terms.optional(),
  tasks: terms.optional(),
  jasc: z.array(z.string().regex(/^\d{2,4}$/)).min(1).optional(),
  system: z.enum(CRITICAL_TOPICS).optional(),
  hardware: terms.optional(),
  words: z.strictObject({ all: z.array(terms).min(1), within: z.int().positive().optional(), unless: terms.optional() }).optional(),
}).refine((rule) => Object.keys(rule).length > 1, 'a rule needs something to look at besides its code')

const tableSchema = z.strictObject({
  version: z.int().positive(),
  cautions: z.array(cautionSchema),
  placing: z.strictObject({ loose: terms, strict: terms }),
  vocabularies: z.record(z.string(), z.strictObject({ words: terms, not: terms.optional(), asSubject: z.enum(['loose', 'strict']).optional() })),
  rules: z.array(ruleSchema),
}).superRefine((table, context) => {
  const fault = (message: string) => context.addIssue({ code: 'custom', message })
  const codes = table.cautions.map((caution) => caution.code)
  const critical: readonly string[] = CRITICAL_TOPICS
  if (new Set(codes).size < codes.length) fault('a caution code stands twice')
  for (const topic of CAUTION_TOPICS) if (!table.cautions.some((caution) => caution.topic === topic)) fault(`no caution for topic ${topic}`)
  for (const code of codes) if (!table.rules.some((rule) => rule.code === code)) fault(`no rule asks for caution ${code}`)
  for (const rule of table.rules) if (!codes.includes(rule.code)) fault(`a rule names an unknown caution: ${rule.code}`)
  for (const caution of table.cautions) {
    const isCritical = critical.includes(caution.topic)
    if (caution.twoStamps !== isCritical) fault(`${caution.code}: two stamps belong to critical systems, and to no other topic`)
    if (isCritical && caution.signalWord !== 'WARNING') fault(`${caution.code}: a critical system is a WARNING`)
  }
  for (const topic of CRITICAL_TOPICS) if (!table.rules.some((rule) => rule.system === topic)) fault(`no rule asks for the system ${topic}`)
  const named = table.rules.flatMap((rule) => [...(rule.words?.all.flat() ?? []), ...(rule.words?.unless ?? [])]).filter((term) => term.startsWith('@'))
  for (const name of named) if (!(name.slice(1) in table.vocabularies)) fault(`a rule names an unknown vocabulary: ${name}`)
})

/** Checks a table read from data; throws a ZodError that names what is wrong. */
export function parseCautionTable(input: unknown): CautionRuleTable {
  const table = tableSchema.parse(input)
  // exactOptionalPropertyTypes is off: an absent list and an undefined one are the same to the matcher.
  return table
}

/** The installation's rule table. */
export const cautionTable: CautionRuleTable = parseCautionTable(data)
