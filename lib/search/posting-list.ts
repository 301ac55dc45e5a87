// The slots that hold one term, ascending, each with how often: four bytes a slot, because common terms stand in most of 100,000 entries.
import 'server-only'

const countBits = 8
/** BM25 hardly tells apart what stands more often than this in one entry. */
const mostCounted = (1 << countBits) - 1
/** Slots have the other 24 bits: sixteen million entries. */
const mostSlots = 1 << (32 - countBits)

export class PostingList {
  /** How many slots. */
  length = 0
  private packed = new Uint32Array(2)

  get bytes(): number {
    return this.packed.byteLength
  }

  /** Adds `slot`, or sets its count when it is in. Throws RangeError for a slot beyond sixteen million. */
  put(slot: number, count: number): void {
    if (slot >= mostSlots) throw new RangeError(`slot ${slot} is beyond what a posting list can hold`)
    const value = ((slot << countBits) | Math.min(count, mostCounted)) >>> 0
    const place = this.placeOf(slot)
    if (place < this.length && this.slotAt(place) === slot) {
      this.packed[place] = value
      return
    }
    if (this.length === this.packed.length) this.resize(Math.ceil(this.length * 1.5))
    this.packed.copyWithin(place + 1, place, this.length)
    this.packed[place] = value
    this.length++
  }

  remove(slot: number): void {
    const place = this.placeOf(slot)
    if (place === this.length || this.slotAt(place) !== slot) return
    this.packed.copyWithin(place, place + 1, this.length)
    this.length--
    if (this.length > 8 && this.length * 3 < this.packed.length) this.resize(Math.ceil(this.length * 1.5))
  }

  forEach(take: (slot: number, count: number) => void): void {
    const { packed, length } = this
    for (let place = 0; place < length; place++) {
      const value = packed[place] ?? 0
      take(value >>> countBits, value & mostCounted)
    }
  }

  /** Where `slot` stands or would stand. The end is looked at first: new entries come there. */
  private placeOf(slot: number): number {
    if (this.length === 0 || this.slotAt(this.length - 1) < slot) return this.length
    let [from, to] = [0, this.length - 1]
    while (from < to) {
      const middle = (from + to) >>> 1
      if (this.slotAt(middle) < slot) from = middle + 1
      else to = middle
    }
    return from
  }

  private slotAt(place: number): number {
    return (this.packed[place] ?? 0) >>> countBits
  }

  private resize(capacity: number): void {
    const other = new Uint32Array(Math.max(2, capacity))
    other.set(this.packed.subarray(0, this.length))
    this.packed = other
  }
}
