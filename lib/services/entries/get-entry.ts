// One entry with its answers, as the actor may see it.
import 'server-only'
import type { AppContext } from '@/lib/context'
import type { Entry } from '@/lib/schemas/post'
import { loadEntry } from '@/lib/services/posts/load-entry'

/** 404 when it is not there or not to be seen. */
export const getEntry = (context: AppContext, id: number): Promise<Entry> => loadEntry(context, id)
