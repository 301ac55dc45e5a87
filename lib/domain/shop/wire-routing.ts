// Results of the wire table about where wire runs: clearance, supports, sag, fluid lines, conduit, bends.
import data from '@/content/shop/wire.json'
import { cite } from './citation'
import { inchesOf } from './exact-fraction'
import type { InputReader } from './shop-input'
import { amount, length, result, words } from './shop-result'
import type { ShopResult } from './shop-table'

/** Limits of routing; what was measured is compared with them. */
export function routing(given: InputReader): ShopResult[] {
  const [clearance, spacing] = [given.optionalNumber('clearance'), given.optionalNumber('spacing')]
  const least = inchesOf(data.clearance.inches)
  const close = clearance === undefined ? undefined : clearance < least - 1e-9 ? 'yours is under it: a grommet is needed' : 'yours is enough'
  const far = spacing === undefined ? undefined : spacing > data.support.inches + 1e-9 ? 'yours are too far apart' : spacing > data.ties.over ? 'yours are near enough; put ties between' : 'yours are near enough'
  return [
    result('clearance', length(least), cite(data.clearance.cite), { how: 'at least, or a grommet', note: close, against: clearance !== undefined && clearance < least - 1e-9 && close }),
    result('support', length(data.support.inches), cite(data.support.cite), { note: far, against: spacing !== undefined && spacing > data.support.inches + 1e-9 && far }),
    result('slack', length(inchesOf(data.slack.deflection)), cite(data.slack.cite), { how: 'normally, pressed by hand' }),
    result('reterminations', amount(data.slack.reterminations, 'reterminations'), cite(data.slack.cite)),
    result('fluid', length(data.fluid.inches), cite(data.fluid.cite)),
    result('fluid-reduced', length(data.fluid.reduced), cite(data.fluid.cite), { note: 'only closely clamped, where 6 in is impracticable' }),
    result('ties', length(data.ties.over), cite(data.ties.cite)), result('lacing', length(data.lacing.upTo), cite(data.lacing.cite)),
    ...bundle(given),
  ]
}

function bundle(given: InputReader): ShopResult[] {
  const diameter = given.optionalNumber('bundle')
  const { conduit, bend, bendTerminal } = data
  const larger = 1 + conduit.percentLarger / 100
  if (diameter === undefined) {
    return [
      result('conduit', words(`inside ${conduit.percentLarger} % larger than the bundle`), cite(conduit.cite)),
      result('bend-radius', words(`${bend.times} × the diameter`), cite(bend.cite)), result('bend-terminal', words(`${bendTerminal.times} × the diameter`), cite(bendTerminal.cite)),
    ]
  }
  return [
    result('conduit', length(diameter * larger), cite(conduit.cite, 'worked'), { how: `bundle + ${conduit.percentLarger} %` }),
    result('bend-radius', length(diameter * bend.times), cite(bend.cite), { how: `${bend.times} × the bundle` }),
    result('bend-terminal', length(diameter * bendTerminal.times), cite(bendTerminal.cite), { how: `${bendTerminal.times} × the diameter, suitably supported` }),
  ]
}
