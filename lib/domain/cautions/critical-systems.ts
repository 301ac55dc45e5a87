// Which critical systems a JASC code stands for. Chapters and codes: FAA Joint Aircraft System/Component (JASC) Code Table, 2008.
// Doubtful codes are counted in: a caution too many costs a line, one too few can cost an aeroplane.
import { CRITICAL_TOPICS, type CautionTopic, type CriticalTopic } from './rule-table'

/** Prefixes of JASC codes by critical topic. A code may stand for several. */
export const CRITICAL_SYSTEMS: Readonly<Record<CriticalTopic, readonly string[]>> = {
  // 535 (fairings) carries no primary load and is left out.
  structure: ['51', '530', '531', '532', '533', '534', '54', '55', '57'],
  // 55 and 57 hold the surfaces themselves: elevator, rudder, aileron, tabs, flaps; 22 can move them.
  'flight-controls': ['22', '27', '552', '554', '5744', '575'],
  // 12 and 73: fuel servicing, and fuel on the engine's side of the firewall.
  fuel: ['1210', '28', '73'],
  brakes: ['3240', '3241', '3242', '3243'],
  'landing-gear': ['32', '5343', '5743'],
  // Belts have no code of their own: they are filed with the seats.
  restraint: ['2510', '2520', '5347'],
  powerplant: ['5346', '61', '71', '72', '73', '74', '75', '76', '77', '78', '79', '80', '81', '82', '83', '84', '85'],
  doors: ['52', '5344', '56'],
  // Airspeed, altimeter and stall warning hang on the same lines.
  'pitot-static': ['341'],
}

/** The critical topics of a JASC code ('2810', '28-10' or a chapter alone); none for an unknown or harmless one. */
export function topicsOfSystem(jasc: string): CriticalTopic[] {
  const code = jasc.replace(/\D/g, '')
  if (code.length < 2) return []
  return CRITICAL_TOPICS.filter((topic) => CRITICAL_SYSTEMS[topic].some((prefix) => code.startsWith(prefix)))
}

/** Whether a topic is one of the critical systems. */
export function isCriticalTopic(topic: CautionTopic): topic is CriticalTopic {
  return CRITICAL_TOPICS.some((critical) => critical === topic)
}

/** Whether a post with these cautions needs two stamps. Waived cautions are the caller's to leave out. */
export function needsTwoStamps(cautions: readonly { twoStamps: boolean }[]): boolean {
  return cautions.some((caution) => caution.twoStamps)
}
