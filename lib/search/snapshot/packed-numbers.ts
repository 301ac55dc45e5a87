// Whole numbers as bytes, seven bits each, small ones in one (LEB128): most numbers of a snapshot are small.
import 'server-only'

export class NumberWriter {
  private bytes = Buffer.allocUnsafeSlow(64 * 1024)
  private length = 0

  /** A whole number from 0 below 2³². */
  write(value: number): void {
    if (this.length + 5 > this.bytes.length) this.bytes = Buffer.concat([this.bytes, Buffer.allocUnsafeSlow(this.bytes.length)])
    let rest = value
    while (rest > 0x7f) {
      this.bytes[this.length++] = (rest & 0x7f) | 0x80
      rest >>>= 7
    }
    this.bytes[this.length++] = rest
  }

  /** What was written since the last call. */
  take(): Buffer {
    const taken = Buffer.from(this.bytes.subarray(0, this.length))
    this.length = 0
    return taken
  }
}

export function decodeNumbers(bytes: Buffer): number[] {
  const numbers: number[] = []
  let value = 0
  let shift = 0
  for (const byte of bytes) {
    value |= (byte & 0x7f) << shift
    if (byte > 0x7f) {
      shift += 7
      continue
    }
    numbers.push(value >>> 0)
    value = 0
    shift = 0
  }
  return numbers
}
