// Invented sentences with numbers, and what the published tables say to them. Source beside each.
import type { NumbersCheck } from '@/lib/domain/numbers-check/numbers-check'

export type FactCase = readonly [text: string, verdict: NumbersCheck['verdict']]

export const tradeCases: readonly FactCase[] = [
  // number drill table: #21 = 0.159 in.
  ['#21 for 5/32 rivets.', 'agrees'],
  // number drill table: #21 = 0.159; 1/8 takes #30.
  ['#21 for the 1/8 rivets in the web.', 'conflicts'],
  // number drill table: #19 = 0.166; the screw is 0.164.
  ['#19 hole for a #8 screw.', 'agrees'],
  // number drill table: 0.1285 is less than 0.164.
  ['A #30 hole passes a #8 screw.', 'conflicts'],
  // unit conversion: 4 mm = 0.1575 in, #21 = 0.159.
  ['4.0 mm is 0.157, a hair under #21.', 'agrees'],
  // AC 43.13-1B ch. 4: 1.5 D and 0.5 D.
  ['5/32 tails: 0.234 wide and 0.078 tall.', 'agrees'],
  // AC 43.13-1B ch. 4: 2 D = 0.3125 in.
  ['5/32 rivets a quarter inch from the edge are fine.', 'conflicts'],
  // AC 43.13-1B table 7-1: 5/16-24: 100-140 in-lb.
  ['AN5-7A at the belt lug, 120 in-lb.', 'agrees'],
  // AC 43.13-1B table 7-1: 720 in-lb; table 100-140.
  ['AN5-7A at the belt lug, 60 ft-lb.', 'conflicts'],
  // AC 43.13-1B table 7-1: 450-500 in-lb.
  ['7/16-20 with a tension nut, 470 in-lb.', 'agrees'],
  // AC 43.13-1B table 7-1: 1/2-20: 480-690 in-lb.
  ['AN8 with a full nut, 200 in-lb.', 'conflicts'],
  // AN470 numbering: 5/32 diameter, 6/16 length.
  ['AN470AD5-6: 5/32 by 3/8.', 'agrees'],
  // AN470 numbering: Diameter is in 32nds: 5/32.
  ['AN470AD5 has a diameter of 5/16.', 'conflicts'],
  // MS20426 head height: Head depth about 0.055 in is more than 0.040.
  ['Flush 5/32 in .040 can be machine countersunk.', 'conflicts'],
  // AC 43.13-1B table 9-2: Table minimum is 1-1/4 in.
  ['1/2 OD aluminum tube, 1-1/4 bend radius.', 'agrees'],
  // AC 43.13-1B table 9-2: Well below the 3/4 in minimum.
  ['5/16 OD aluminum bent to 3/8 radius.', 'conflicts'],
  // unit conversion: 12 in per ft.
  ['35 ft-lb equals 420 in-lb.', 'agrees'],
  // unit conversion: 100/12 = 8.3 ft-lb.
  ['100 in-lb is 12 ft-lb.', 'conflicts'],
  // antenna maker; kit plans: Depends on skin and antenna.
  ['Antenna doubler is .040.', 'cannot-tell'],
  // no source: Not a shop-table fact.
  ['Compressor makes 6 cfm.', 'cannot-tell'],
]
