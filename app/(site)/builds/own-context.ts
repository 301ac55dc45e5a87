// Context of a page on one build. A visitor gets it too: what is private is not there for them, as for any other member.
import { currentActor } from '@/lib/auth/current-user'
import { contextFor, type AppContext } from '@/lib/context'

/** No sign-in page here: it would say which builds there are. The services answer 404 to everybody but the owner. */
export const ownContext = async (): Promise<AppContext> => contextFor(await currentActor())
