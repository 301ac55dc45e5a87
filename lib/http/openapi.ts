// Describes the interface in OpenAPI 3.1 from the routes themselves: the schemas that check requests are the ones described.
import 'server-only'
import { z } from 'zod'
import * as post from '@/lib/schemas/post'
import { problemSchema } from '@/lib/schemas/problem'
import { measurementSchema } from '@/lib/schemas/measurement'
import { hitSchema, suggestionSchema } from '@/lib/schemas/search'
import { shopAnswerSchema, shopResultSchema, sourceSchema } from '@/lib/schemas/shop'
import { declarationOf, methodNames, type Endpoint, type Handler, type Method } from './route'

type Json = Record<string, unknown>
type Addresses = Record<string, Record<Method, Handler>>
interface Operation { path: string; method: Method; id: string; declared: Endpoint<unknown, unknown> }

export const openApiSchema = z.object({
  openapi: z.literal('3.1.0'), info: z.record(z.string(), z.unknown()), servers: z.array(z.unknown()), security: z.array(z.unknown()),
  paths: z.record(z.string(), z.unknown()), components: z.record(z.string(), z.unknown()),
})

/** Shapes that many answers share, by the name they have in the description. */
const shared: Record<string, z.ZodType> = {
  Caution: post.cautionSchema, Stamp: post.stampSchema, Outcomes: post.outcomesSchema, Remark: post.remarkSchema,
  Answer: post.answerSchema, Entry: post.entrySchema, Hit: hitSchema, Suggestion: suggestionSchema,
  ShopAnswer: shopAnswerSchema, ShopResult: shopResultSchema, Source: sourceSchema, Measurement: measurementSchema, Problem: problemSchema,
}

/** The whole document for these addresses. Pure but for the schemas it reads. */
export function describeInterface(addresses: Addresses, version: string): z.infer<typeof openApiSchema> {
  const operations = Object.entries(addresses).flatMap(([path, handlers]) => methodNames.flatMap((method): Operation[] => {
    const declared = declarationOf(handlers[method])
    return declared ? [{ path, method, declared, id: [method.toLowerCase(), ...path.split(/[^a-z]+/).filter((w) => w !== '' && w !== 'api')].join('_') }] : []
  }))
  const requests = namedSchemas(operations.flatMap((o): [string, z.ZodType][] => (o.declared.body ? [[`${o.id}_request`, o.declared.body]] : [])), 'input')
  const answers = namedSchemas([...Object.entries(shared), ...operations.flatMap((o): [string, z.ZodType][] => (o.declared.response ? [[`${o.id}_response`, o.declared.response]] : []))], 'output')
  const paths: Record<string, Json> = {}
  for (const operation of operations) {
    paths[operation.path] = { ...paths[operation.path], [operation.method.toLowerCase()]: describeOperation(operation, requests.refOf, answers.refOf) }
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Pilothole', version, description: 'Cautions are part of every representation of a post. Offsets count UTF-16 code units.' },
    servers: [{ url: '/' }],
    security: [{ session: [] }, { token: [] }],
    paths,
    components: {
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: 'next-auth.session-token', description: 'A write needs a same-origin Origin or Sec-Fetch-Site.' },
        token: { type: 'http', scheme: 'bearer', description: 'A personal token, pht_…' },
      },
      schemas: { ...requests.schemas, ...answers.schemas },
      responses: { Problem: { description: 'Refused, with what to do about it', content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } } },
    },
  }
}

/** JSON Schemas by name, and the reference to each; a schema that is used twice keeps its first name. */
function namedSchemas(named: readonly [string, z.ZodType][], io: 'input' | 'output') {
  const registry = z.registry<{ id: string }>()
  const names = new Map<z.ZodType, string>()
  for (const [name, schema] of named) {
    if (names.has(schema)) continue
    names.set(schema, name)
    registry.add(schema, { id: name })
  }
  const { schemas } = z.toJSONSchema(registry, { io, unrepresentable: 'any', uri: (name) => `#/components/schemas/${name}` })
  const bare = Object.entries(schemas).map(([name, { $id: _id, $schema: _dialect, ...schema }]) => [name, schema] as const)
  return { schemas: Object.fromEntries(bare), refOf: (schema: z.ZodType) => ({ $ref: `#/components/schemas/${names.get(schema)}` }) }
}

function describeOperation({ path, method, id, declared }: Operation, requestOf: (s: z.ZodType) => Json, answerOf: (s: z.ZodType) => Json): Json {
  const isWrite = method !== 'GET' && !declared.isRead
  const status = declared.status ?? 200
  const answer: Json = {
    description: status === 204 ? 'Done' : declared.summary,
    ...(status === 201 ? { headers: { Location: { description: 'Where it can be read', schema: { type: 'string' } } } } : {}),
    ...(declared.response ? { content: { 'application/json': { schema: answerOf(declared.response) } } } : {}),
  }
  return {
    operationId: id,
    summary: declared.summary,
    ...(isWrite ? {} : { security: declared.isAlwaysOpen ? [] : [{}, { session: [] }, { token: [] }] }),
    parameters: [...pathParameters(path), ...queryParameters(declared.query), ...(isWrite ? [idempotencyKey] : [])],
    ...requestBody(declared, requestOf),
    responses: { [status]: answer, ...Object.fromEntries(refusals(path, method, isWrite, declared).map((code) => [code, { $ref: '#/components/responses/Problem' }])) },
  }
}

const idempotencyKey = { name: 'Idempotency-Key', in: 'header', description: 'The same key and body within 24 hours: the same answer, and one row', schema: { type: 'string', minLength: 1, maxLength: 200 } }

function requestBody(declared: Endpoint<unknown, unknown>, requestOf: (s: z.ZodType) => Json): Json {
  if (declared.upload) {
    const content = Object.fromEntries(declared.upload.types.map((type) => [type, { schema: { type: 'string', description: 'One JSON object a line' } }]))
    return { requestBody: { required: true, content } }
  }
  return declared.body ? { requestBody: { required: true, content: { 'application/json': { schema: requestOf(declared.body) } } } } : {}
}

function refusals(path: string, method: Method, isWrite: boolean, declared: Endpoint<unknown, unknown>): string[] {
  const takesBody = declared.body !== undefined || declared.upload !== undefined
  const named = path.includes('{') || isWrite
  return [400, 401, ...(isWrite ? [403] : []), ...(named ? [404] : []), ...(isWrite ? [409] : []), ...(takesBody ? [413, 415] : []), 422, 429, 503]
    .filter((code) => !(declared.isAlwaysOpen && method === 'GET' && code === 401)).map(String)
}

function pathParameters(path: string): Json[] {
  return [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({ name, in: 'path', required: true, schema: name === 'id' ? { type: 'integer', minimum: 1 } : { type: 'string' } }))
}

function queryParameters(query: z.ZodType | undefined): Json[] {
  if (!query) return []
  const { properties = {}, required = [] } = z.toJSONSchema(query, { io: 'input', unrepresentable: 'any' })
  return Object.entries(properties).map(([name, schema]) => ({ name, in: 'query', required: required.includes(name), schema }))
}
