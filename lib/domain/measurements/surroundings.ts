// The words round a number that say what it is: a page, a count of hours, a screw's size, a drill. Lists of the trade's English; no logic but look-up.

const words = (text: string): ReadonlySet<string> => new Set(text.trim().split(/\s+/))

/** The number behind these is a name: page 12, step 6, Table 7-1, rib #3. */
export const labels = words(`
  page pages pg p step steps section sections sec chapter ch table tables fig figs figure figures para paragraph paragraphs item items note notes
  rev revision version ver part parts serial sn pn model drawing dwg question lesson answer task rib ribs bay bays frame frames bulkhead station kit bulletin sb
  ac cfr far faa iso sta fs wl bl plan house mentor stamp cylinder cylinders rule room box bag row line phone tel call order job invoice lot batch line position pos
  ch channel day week chapter appendix letter code key type class grade category level phase stage round flight hull wing aircraft builder plane
  tag label port relay fuse breaker circuit gate runway route tank`)

/** Behind these a fraction, too, is "this of that": sheet 3/4, score 3/4. */
export const fractionLabels = words('page pages pg sheet step steps section figure fig table item rev revision score scored day lesson version question chapter rated')

/** In front of a drill's number or behind it. */
export const drillNouns = words('drill drills bit bits hole holes reamer reamers pilot pilots twist drillbit clearance clecos cleco bushing')
/** What is done with a drill, within a few words in front of its number. */
export const drillVerbs = words('drill drilled drilling drills redrill ream reamed reaming bit bits open opened opening enlarge enlarged upsize upsized upsizing hole holes pilot')

/** What a number sign in front of means a screw's or wire's size, or a place in a row: never a drill. */
export const screwNouns = words(`screw screws nutplate nutplates nut nuts washer washers tapper tappers tapping bolt bolts stud studs machine wood phillips pozidriv torx
  pencil grit sandpaper paper wool rod insert inserts rivnut rivnuts rivnutplate standoff standoffs thread threads threaded hardware lug lugs terminal terminals dimple dimples`)
export const placeNouns = words(`rib ribs cylinder cylinders bay bays frame frames cause reason reasons mistake mistakes problem problems priority tip rule lesson fan choice
  thing things question seat tank wing bulkhead plug injector step steps page item task on in of place one way enemy killer complaint fault exhaust`)
/** May stand between a size and its screw: #8 flush screw. */
export const screwAdjectives = words(`flush pan head headed machine wood sheet metal self truss brass stainless steel countersunk flat cross hex button socket round cap fine coarse
  structural nylon long short locking lock anchor plate floating fixed ring 100 degree`)
export const wireNouns = words('wire wires cable cables awg gauge gage')

/** Units and nouns that make the number in front something else than a length. */
export const otherQuantities = words(`
  h hr hrs hour hours min mins minute minutes s sec secs second seconds day days week weeks month months year years am pm o'clock
  turn turns mix ratio part parts cup cups pint pints quart quarts qt gal gallon gallons litre litres liter liters l ml cc oz ounce ounces fl
  lb lbs pound pounds kg g gram grams grammes ton tons mile miles km kt kts knot knots mph rpm cfm hp kw w watt watts v volt volts kv mv amp amps ah ma
  ohm ohms hz khz mhz ghz db dba percent pct per each apiece cent cents dollar dollars euro euros usd eur times d diameters
  throttle full done finished complete way speed power scale price wave span chord mac tank tanks teaspoon teaspoons tsp tbsp spoon cubic square sq
  points point builders people gs done gpm gph fpm fps pt pts k m3 share strength dose score scores flaps flap acre`)

/** Behind a count and a fraction: "3 1/8 rivets" are three. */
export const countedNouns = words(`rivets holes drills bits clecos bolts screws washers nuts bushings pins tubes angles sheets grommets pieces strips shims spacers doublers fittings hoses
  reamers sockets plugs`)

/** What is cut, drilled and measured: with one of these beside it a doubtful number is a length. */
export const partNouns = words(`
  hole holes sheet sheets skin skins rivet rivets bolt bolts tube tubes tubing pipe bar rod angle angles rib ribs spacer spacers shim shims doubler doublers plate plates bushing
  grommet grommets bit bits drill drills reamer radius diameter bore gap slot pin pins strip strips hose cable fitting fittings socket wrench flange flanges web webs material stock
  aluminium aluminum alclad steel plywood oak wood screw screws clevis cleco clecos countersink dimple dimples washer washers bend overlap margin clearance play slack edge pitch
  wide thick tall deep long high across apart thickness width depth length height distance proud low off over under floor spar bulkhead frame extrusion lip od id size conduit`)

/** Sheet written without its point: 032 sheet. */
export const sheetNouns = words('sheet sheets skin skins angle angles rib ribs doubler doublers plate material stock shim shims aluminium aluminum alclad thick web webs flange')

/** Behind "in" these make it a preposition: 6 in the bag, 4 in each. */
export const placeWords = words(`
  the a an each every my your our his her its their this that these those it them which what both all any some one two three four five six seven eight nine ten
  place line row rows sequence order turn turns stock hand use front half case fact total addition common general practice time position succession between-times another
  january february march april may june july august september october november december spring summer winter autumn flight service between-flights parallel series and or`)

/** In front of a date: on 3/8 we closed it. */
export const dateWords = words('on since dated until till date')
export const determiners = words('the a an my your our his her their its this that these those all them us each every what which')
/** A value behind these has no unit: version 0.42, a factor of 0.75. */
export const bareValueWords = words('version ver rev factor gravity ratio coefficient index swr cl cd cp mach density probability scale gain load r2 chapter section figure paragraph para ac')

export const enlargingWords = words('open opened opening enlarge enlarged upsize upsized upsizing drill drilled ream reamed step stepped goes went up')
