// Who is acting. Mentorship stands beside the ladder: it is granted, never climbed.

export type Role = 'member' | 'moderator' | 'steward'

export interface Member {
  readonly id: number
  readonly name: string
  readonly role: Role
  /** The number on the stamp while mentorship lasts. */
  readonly mark: string | null
}

/** Null is a visitor. Suspended and closed members never become an actor. */
export type Actor = Member | null
