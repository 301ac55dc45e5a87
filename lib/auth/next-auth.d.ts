// What our sessions carry: the member's id and the epoch of their last password change. Nothing else is trusted from a cookie.
import 'next-auth'

declare module 'next-auth' {
  interface Session { user: { id: number; epoch: number } }
  interface User { epoch: number }
}
