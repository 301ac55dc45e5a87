// Which entries hold which terms of one question, as bits: no object an entry, because common words stand in thousands.
import 'server-only'

export class HeldTerms {
  /** Slots that hold any term. */
  readonly slots: number[] = []
  private readonly width: number
  private readonly bits: Int32Array
  private slot = 0

  constructor(terms: number, readonly size: number) {
    this.width = Math.max(1, Math.ceil(terms / 32))
    this.bits = new Int32Array(this.width * size)
  }

  note(slot: number, term: number): void {
    const place = slot * this.width
    if (this.isEmpty(place)) this.slots.push(slot)
    const at = place + (term >>> 5)
    this.bits[at] = (this.bits[at] ?? 0) | (1 << (term & 31))
  }

  /** Looks at one slot: `holds` answers for the slot looked at last, so that asking makes no closure an entry. */
  at(slot: number): (term: number) => boolean {
    this.slot = slot
    return this.holds
  }

  /** Equal for slots that hold the same terms; null when there are too many terms for one number. */
  pattern(slot: number): number | null {
    return this.width === 1 ? (this.bits[slot] ?? 0) : null
  }

  private readonly holds = (term: number): boolean => ((this.bits[this.slot * this.width + (term >>> 5)] ?? 0) & (1 << (term & 31))) !== 0

  private isEmpty(place: number): boolean {
    for (let i = 0; i < this.width; i++) if (this.bits[place + i] !== 0) return false
    return true
  }
}
