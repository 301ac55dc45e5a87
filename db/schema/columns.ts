// Columns that several tables repeat. Time is UTC milliseconds; ids are integers given by SQLite.
import { integer } from 'drizzle-orm/sqlite-core'

/** Integer primary key, never reused (AUTOINCREMENT), because ids stand in permanent links. */
export const id = () => integer().primaryKey({ autoIncrement: true })

/** A moment in UTC milliseconds. The caller's clock sets it; the database never does. */
export const moment = () => integer()
