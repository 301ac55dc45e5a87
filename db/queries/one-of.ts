// `column in (…)` for lists of any length: one variable, so that the statement is the same whatever the number of values.
import 'server-only'
import { sql, type Column, type Placeholder, type SQL } from 'drizzle-orm'

/** True where `column` is one of `values`; of a prepared statement, one of the JSON array that its placeholder is given. */
export function oneOf(column: Column, values: readonly (number | string)[] | Placeholder): SQL {
  return sql`${column} in (select value from json_each(${Array.isArray(values) ? JSON.stringify(values) : values}))`
}
