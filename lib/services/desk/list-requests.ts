// What mentors asked the author of a post for: its page shows it, so that the author can answer with a remark or an edit.
import 'server-only'
import { listOpenRequests } from '@/db/queries/desk'
import type { AppContext } from '@/lib/context'

export type OpenRequest = Awaited<ReturnType<typeof listOpenRequests>>[number]

/** Open requests under these posts, oldest first: one query. The caller has loaded the posts and may read them. */
export const listRequests = ({ reader }: AppContext, postIds: readonly number[]): Promise<OpenRequest[]> => listOpenRequests(reader, postIds)
