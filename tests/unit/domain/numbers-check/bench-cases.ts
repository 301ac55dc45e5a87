// Sentences as builders write them to one another, and whether the tables agree. Written down before the check was first run on them.
// Values: ANSI B94.11M drills, AC 43.13-1B tables 4-6, 7-1 and 9-2, AN/MS numbering, NAVEDTRA 14018 rivet rules, NIST SP 811, as in content/shop.
import type { FactCase } from './trade-cases'

const agrees = (...texts: string[]): FactCase[] => texts.map((text) => [text, 'agrees'])
const conflicts = (...texts: string[]): FactCase[] => texts.map((text) => [text, 'conflicts'])
const cannotTell = (...texts: string[]): FactCase[] => texts.map((text) => [text, 'cannot-tell'])

export const benchCases: readonly FactCase[] = [
  // holes for rivets
  ...agrees('#30 for 1/8 rivets.', 'Open the holes for 3/32 rivets with a #40.', 'Final drill the 1/8 rivet holes to 0.1285.', '1/8 rivets go in a #30 hole.', 'AN470AD4 wants a number 30 bit.',
    'Ream to #40 for AN426AD3.', 'For 3/16 rivets a #11 drill.', 'MS20426AD3-4 goes in a #41 hole.', 'Quarter inch rivets take an F drill.', 'Pull rivets of 1/8 take #30.',
    '1/8 blind rivets go in a hole of 0.129 to 0.132.', 'Drill #40 first, then #30 for the 1/8 rivets.'),
  ...conflicts('#40 for the 1/8 rivets along the spar.', 'A #30 bit for 3/32 rivets is the one.', 'AN470AD5 needs a #30 hole.', '3/32 rivets: #30.', 'Use a 1/4 drill for 5/32 rivets.',
    'Drill the flange 0.098 for the 1/8 rivets.', '#10 for 1/8 pop rivets.', '#12 for 5/32 rivets.'),
  // holes for screws and bolts
  ...agrees('#18 clears a #8 screw.', 'A #19 hole is a close fit on an 8-32.', '#27 hole for a #6 screw.', 'A #10 screw needs at least 0.190.', 'AN3 bolts in #11 holes.', 'AN4 through a 1/4 hole.', 'A letter F drill clears AN4.'),
  ...conflicts('#6 screws pass through a #30 hole.', '10-32 screws slide through a 3/16 hole.', 'Use a #40 for the #4 screws.', 'AN5 bolt in a 1/4 hole.', 'AN6 goes in a 5/16 hole.', '1/4-28 bolt, drill V.'),
  ...cannotTell('#29 for tapping 8-32.'),
  // units
  ...agrees('3/16 is 4.76 mm.', '0.032 equals 0.81 mm.', '25 mm is 0.984 in.', '25 in-lb works out to 2.8 N·m.', '20 ft-lb = 27 N·m.', '1/8 in = 3.2 mm.', '30 psi is about 2 bar.', '72 F is 22 C.', '#30 is 0.1285.',
    'A #40 bit is 0.098.', 'Letter F is 0.257.', '#30 is a bit over 1/8.', '5/64 equals 0.078.', '40 thou is 1 mm.', '2 m is 6.56 ft.'),
  ...conflicts('50 in-lb is 5 ft-lb.', '1/4 in is 6.8 mm.', '10 N·m comes to 50 in-lb.', '100 psi is 10 bar.', 'A #10 drill is 0.250.', '#40 is bigger than #30.', '7/16 is 0.4735.'),
  // shop heads
  ...agrees('Shop head on a 1/8 rivet: 3/16 wide, 1/16 high.', '1/8 tails should be 0.188 across and 0.063 high.', 'Driven heads of 3/32 rivets 0.140 wide.', 'Shop heads 1.5 D wide and half a D tall.'),
  ...conflicts('1/8 tails 1/8 wide will hold.', '5/32 shop heads, 0.020 tall is enough.', 'A driven head of 1.1 D is plenty.', 'Tail on AN470AD4 0.250 wide and 0.063 tall.'),
  // edge distance
  ...agrees('1/8 rivets want 1/4 from the centre to the edge.', 'Edge distance 2 D at least.', 'Keep 3/32 rivets 3/16 from the edge.', 'AN470AD4, edge distance 0.30.', 'Flush 1/8 rivets need 5/16 to the edge.'),
  ...conflicts('1/8 rivets at 3/16 from the edge are OK.', 'Edge distance of 1.5 D will do.', '3/16 rivets with an edge distance of 0.300.', 'A quarter inch of edge is fine for AN470AD5.'),
  // pitch
  ...agrees('1/8 rivets 1 inch apart.', 'Pitch 4 D to 6 D.', '3/32 rivets on 3/8 centres.', 'Minimum pitch is 3 D.', 'Rows 2.5 D apart.'),
  ...conflicts('1/8 rivets 1/4 apart.', 'Pitch of 2 D is tight but fine.', '5/32 rivets spaced 3/8.'),
  // rivet length
  ...agrees('AN470AD4-4 for a .064 stack.', 'AN426AD3-3 through two .025 sheets.', '1/8 rivets with a .100 grip, 5/16 long.', 'Rivet length is grip plus 1.5 D.'),
  ...conflicts('AN470AD4-8 for two .032 sheets.', 'AN470AD5-4 for a grip of 0.125.', 'Rivet length: grip plus half a D.', 'AD3-6 in a total of .050.'),
  // torque
  ...agrees('AN3 with a full nut, 20-25 in-lb.', 'AN4: 50 to 70 inch pounds.', 'AN6 full nut 175 in-lb.', '1/4-28, 60 in-lb.', 'Shear nut on an AN4: 35 in-lb.', 'AN3-5A, 2.5 N·m.', "10-32 nuts at 15 in-lb when they're thin shear nuts.",
    '1/4-20, 45 in-lb.', '-6 flare nut on aluminum, 110 in-lb.', 'AN10 bolt, 1200 in-lb.'),
  ...conflicts('AN4 bolts 70 ft-lb.', 'AN3 at 50 in-lb.', 'AN5 with a shear nut, 120 in-lb.', '3/8-24 tension nut 300 in-lb.', 'AN4-10A to 12 N·m.', 'AN818-4 on aluminium tube, 140 in-lb.'),
  ...cannotTell('Prop bolts 25 ft-lb.', 'Spark plugs 35 ft-lb.'),
  // grommets
  ...agrees('3/8 grommet takes a 5/8 hole.', 'AN931-6-10 needs a 5/8 hole.', 'AN931-4-7 fits a 7/16 hole.', 'Hole for a 1/2 bore grommet is 13/16.'),
  ...conflicts('AN931-8-13 goes in a 1/2 hole.', 'A 3/8 grommet in a 3/8 hole.', '1/4 ID grommet: 5/8 hole.'),
  // bends
  ...agrees('.032 2024-T3 bent at 3/32 radius.', '3/8 aluminum tube, bend radius 15/16.', '3/4 steel tube bends to 2-5/8 radius.', '6061-T6 .032 at 1/32 radius.'),
  ...conflicts('2024-T3 .064 with a 1/16 radius.', '1/4 OD aluminium line bent to 3/8 radius.', '7075-T6 .064: 1/8 radius.', 'Bend .032 2024-T3 at 1 t.'),
  // countersinks
  ...agrees('1/8 flush in .063 may be countersunk.', 'Dimple .025 skins for AN426AD3.', "AN426AD4 in .020: dimple, it's too thin to cut."),
  ...conflicts('Machine countersink 1/8 flush rivets in .032.', '3/16 flush rivets countersunk into .050 sheet.', 'Countersink at 82 degrees for AN426.'),
  // bolt length and grip
  ...agrees('AN3-5A has a 1/4 grip.', 'AN4-10A has 9/16 of grip.', 'AN5-12A is 1-11/32 long.', 'AN3-10A for a 5/8 stack.'),
  ...conflicts('AN3-7A has a grip of 7/16.', 'AN bolt grip is the dash number times 1/16.', 'AN4-7A through 1 inch of stack.'),
  // designations
  ...agrees('AN3 is 3/16.', 'AN470AD4-6 is 1/8 in diameter and 3/8 long.', 'AN426AD3 is a 3/32 flush rivet.', 'AN5 has a 5/16-24 thread.'),
  ...conflicts('AN3-5A is a 3/8 bolt.', 'AN470 is a flush head.', 'AD4-5 is 1/8 by 5/8.', 'MS20470AD4 is 4/16 in diameter.'),
  // what is no claim
  ...agrees("Never drill 1/8 rivets with a #40, it's #30."),
  ...cannotTell("Don't use #40 for 1/8 rivets.", 'Is #30 right for 3/32 rivets?', 'He said a #40 for the 1/8 rivets.', 'The old chart says #19 for 1/8 rivets.', '"AN3 gets 70 ft-lb" was on the sticker.'),
  // what no table is about
  ...cannotTell('Paint dries in 4 hours at 70 F.', 'Rib 7 takes a .032 stiffener.', 'Tank holds 21 gallons.', 'My bench is 36 inches tall.', 'Set the regulator at 40 psi.', 'Firewall steel is .016.',
    'The wing spar doubler is 1/8 thick.', 'Use 12 rivets along the flange.', 'Engine mount bolts need new cotter pins.', 'Oil temp 180 F in cruise.', 'Flap gap 1/8.', 'Brake line is 1/4.',
    'Wire strippers set to 22 AWG.', 'Drill 1/16 holes at each end to stop the crack.', 'Washers AN960-416 under every nut.'),
]
