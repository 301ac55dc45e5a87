// The one clock. Services take `now` from their context, so that tests set it.

/** UTC milliseconds. */
export const systemClock = (): number => Date.now()
