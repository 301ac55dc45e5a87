// The words by which a post speaks of what a balloon on a figure points at. Matching is key-balloons.ts.

export interface BalloonWords {
  /** The part the figure shows: a feature's words count only near it. */
  part: string
  /** By the balloon's label. `+` first: the words name the part themselves and count anywhere. */
  features: Readonly<Record<string, string>>
  /** Results whose value is the balloon's own dimension: their number beside the part speaks of it too. Never an input, which every hit holds. */
  values?: Readonly<Record<string, readonly string[]>>
}

const lines = '(?:brake|fuel|oil|vent|pitot|static|hydraulic) (?:lines?|tubes?|hoses?)'

/** Sources of regular expressions, without capture groups, tried at the beginnings of words. */
export const BALLOON_WORDS: Readonly<Record<string, BalloonWords>> = {
  grommet: {
    part: 'grommets?|an931|ms35489',
    features: {
      Bore: 'bores?|inside diameter|wire.s side', Groove: 'grooves?', 'Cut edge': '(?:cut|raw|sharp|bare|primed) edges?|edges? of the hole|deburr\\w*|burrs?|chamfer\\w*',
      Wire: `wires?|wiring|cables?|bundles?|harness|loom|conduit|chaf\\w+|${lines}`,
    },
    values: { Groove: ['hole', 'hole-groove'] },
  },
  rivet: {
    part: 'rivets?|riveted|riveting|an4[27]\\d\\w*|ms20\\d{3}\\w*|nas1097\\w*',
    features: {
      Hole: 'figure.eight|oval holes?|elongated|oversized? holes?|holes? (?:is |was |are |were )?(?:too |over)?(?:size|sized|big|large)|final holes?|match.drill\\w*|ream\\w*',
      Length: '(?:too )?(?:long|short)|longer|shorter|lengths?|rivet cutter|protru\\w+|sticks? out',
      'Shop head': '+(?:shop heads?|bucktails?|driven heads?|bucking|bucked|clinched|cracked heads?)', Rim: 'rim',
      'Least edge': '+(?:edge (?:distances?|margins?)|short edges?)', 'Least pitch': '+(?:rivet (?:pitch|spacing))|pitch|spacing',
    },
    values: { Hole: ['hole'] },
  },
  'countersink-or-dimple': {
    part: 'flush|rivets?|countersunk|an426\\w*|ms20426\\w*',
    features: { 'Sheet under the head': '+(?:countersink\\w*|countersunk|knife edges?)', Dimple: '+(?:dimpl\\w+)' },
  },
  bolt: {
    part: 'bolts?|an\\d{1,2}(?:-\\d+a?)?',
    features: { 'End of the grip': 'grips?|shanks?', 'Threads past the nut': 'threads?', Washers: 'washers?' },
  },
  torque: {
    part: 'torqu\\w+|nuts?|bolts?',
    features: {
      Nut: 'prevailing|drag|self.locking|lock ?nuts?|castle nuts?|castellated|cotters?|final torque',
      Drive: 'torque wrench\\w*|extensions?|crow.?foot|adapters?|click\\w*|calibrat\\w+', Grip: 'handle|middle of the grip',
    },
  },
  bend: {
    part: 'bend\\w*|bent|brake|formed|forming',
    features: { 'Mold point': 'mou?ld (?:point|line)|set ?backs?', 'Bend tangent line': 'tangent|sight ?lines?|bend lines?', Bend: 'radius|radii|crack\\w*|spring.?back|bend allowance' },
  },
  tube: {
    part: `tubes?|tubing|hoses?|flar\\w+|${lines}`,
    features: { Flattening: 'flatten\\w*|kink\\w*|oval\\w*|collaps\\w+', Tube: 'outside diameter|wall thickness|flar\\w+|sleeves?|b.nuts?', 'Centre of the bend': 'bend radius|radius|benders?' },
  },
  wire: {
    part: 'wires?|wiring|cables?|bundles?|harness|loom',
    features: { 'Cut edge': 'edges?|grommets?|chaf\\w+', 'Least clearance': 'clearances?|clear of', Bundle: 'clamp\\w*|cable ties?|lacing|laced' },
  },
}
