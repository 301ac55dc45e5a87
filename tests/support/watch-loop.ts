// Measures the longest time the event loop was held up.
import { monitorEventLoopDelay } from 'node:perf_hooks'

/** Starts watching; `stop` gives the longest stall in milliseconds, above the timer's own millisecond. */
export function watchLoop(): { stop(): number } {
  const histogram = monitorEventLoopDelay({ resolution: 1 })
  histogram.enable()
  return {
    stop: () => {
      histogram.disable()
      return histogram.max / 1e6
    },
  }
}
