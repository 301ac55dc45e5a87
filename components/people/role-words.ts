// Names of roles and states, as people read them.
import type { Role } from '@/lib/policy/actor'

export const roleWords: Record<Role, string> = { member: 'Builder', moderator: 'Moderator', steward: 'Steward' }
export const stateWords = { active: '', suspended: 'suspended', closed: 'account closed' } as const
