// The one way in which rendering says no to a text. Services turn it into an error at the field.

/** `field` is the key under which the text was given; `message` tells its writer in plain words what to change. */
export class TextRefusedError extends Error {
  override readonly name = 'TextRefusedError'

  /** By name: the framework bundles this file more than once, and the renderer of one bundle throws into another. */
  static override [Symbol.hasInstance](value: unknown): value is TextRefusedError {
    return value instanceof Error && value.name === 'TextRefusedError'
  }

  constructor(readonly field: string, message: string) {
    super(message)
  }
}
