// A figure in words, for who cannot see it: what it shows, its dimensions, its balloons.
import type { Figure } from './figure'

/** One paragraph; the dimensions by the names of their fields. */
export function figureWords({ dimensions, balloons, byEye }: Figure): string {
  const scale = byEye ? `Drawn to scale but for ${byEye}.` : 'Drawn to scale.'
  const sizes = dimensions.length === 0 ? [] : [`Dimensions: ${dimensions.map(({ field, label }) => `${field.replaceAll('-', ' ')} ${label.text}`).join(', ')}.`]
  return [scale, ...sizes, ...balloons.map(({ n, label, note }) => `${n}: ${label}, ${note}.`)].join(' ')
}
