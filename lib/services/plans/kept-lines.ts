// What became of pasted lines: how many were kept, and those that were not, so that they can be mended and sent again.
import 'server-only'
import type { BadLine } from './read-lines'

export interface KeptLines { kept: number; bad: BadLine[] }
