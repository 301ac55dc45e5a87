// Whose number it is: the author's advice, a reading, or nobody's claim (asked, reported, negated, supposed). Word lists over the sentence and its clauses.
import type { Mark } from './marks'
import type { ClaimRole } from './numbers-check'

const asking = /^\W*(?:is|are|does|do (?:i|you|we|they|these|those|the)|can (?:i|you|we|one|a|an|the|somebody|anyone)|should|would|could|will|shall|what|which|how|why|has|did|anyone|anybody)\b|\b(?:i wonder(?:ed)?|we wondered|wondering|not sure|unsure|don't know|do not know|no idea|anyone know|question is)\b/i
const reading = /\b(?:(?:i|we|he|she|they|mine|it|that|this|these|those|ours|caliper|calipers|gauge|gage|micrometer|rule|ruler|wrench|which|holes?|heads?|tails?|edges?|bolts?|rivets?|drills?|bits?|sheets?|skins?|grommets?|one|ones) (?:all |now |actually |only |just )?(?:measured?s?|reads?|read|mic(?:'d|ed|s)|came out|comes out|turned out|shows?|showed)|measured|measuring|as measured|calipers? (?:say|says|said)|came out|turned out|i get|i got|i have only|i've only|i've got|mic'd|miked)\b/i
const shouldMeasure = /\b(?:should|must|ought to|has to|have to|needs? to|will) (?:\w+ )?(?:measure|read|come out|show)\b/i
const speaker = '(?:he|she|they|someone|somebody|people|some|everyone|everybody|friend|guy|fellow|buddy|neighbou?r|mate|instructor|inspector|mechanic|vendor|seller|shop|supplier|builder|owner|mentor|dealer|chart|book|manual|handbook|video|forum|page|site|website|internet|web|post|poster|label|sticker|placard|card|box|package|packet|bag|catalog(?:ue)?|drawing|drawings|plans?|kit|sheet|note|notes|instructions?|leaflet|article|table|text|maker|factory)'
const speaking = '(?:said|says?|told|tells?|claims?|claimed|wrote|writes|written|reckons?|reckoned|thinks?|thought|swears?|swore|suggests?|suggested|recommends?|recommended|insists?|insisted|states?|stated|quotes?|quoted|mentions?|mentioned|believes?|believed|advised|advises|had|has it|called for|calls? for|wants|prints|printed|listed|gave)'
const reported = new RegExp(`\\b${speaker} (?:there |here |once |always |often |also |still |even |on it |at [a-z]+ |in [a-z]+ |from [a-z]+ |for [a-z]+ |of mine )?${speaking}\\b|\\b(?:according to|supposedly|allegedly|rumou?r|i(?:'ve| have)? (?:once )?(?:read|heard|was told|been told)|we were told|i was told|as told|it(?:'s| is| was) (?:said|written|printed)|hearsay|some (?:use|drill|torque|set|put|go)|others? (?:use|drill|torque|set|put|go)|used to|per the old|(?:old|outdated|wrong|previous|former|earlier) (?:chart|table|book|manual|list|sheet|page|edition|drawing|rule|value|number)s?)\\b`, 'i')
const done = '(?:drilled|used|found|torqued|tightened|set|put|made|bent|cut|bought|tried|installed|riveted|bucked|countersunk|dimpled|opened|ran|went|did|ended up|noticed|saw|seen|discovered|reamed|grabbed|chose|picked|pulled|squeezed|left|placed|spaced|fitted|mixed up|took|had|thought|ordered|drove|enlarged|started)'
const finding = new RegExp(`\\b(?:i|we|he|she|they|somebody|someone|owner|helper|friend|builder|shop|who)(?:'d|'ve)? (?:had |have |has |once |first |then |also |accidentally |already |mistakenly |just |wrongly |must have )*${done}\\b|\\b(?:was|were|had been|has been|have been|been|got) (?:all |only |already |wrongly |mistakenly )?(?:drilled|torqued|tightened|set|made|bent|cut|installed|riveted|bucked|countersunk|dimpled|opened|reamed|spaced|fitted|enlarged|used|put|found)\\b|\\b(?:by mistake|accidentally|mistakenly|last time|in my case|on my kit|i messed|i goofed|it was|there was|there were|they were)\\b`, 'i')
/** "never less than", "don't exceed": a limit, and no negation. */
const limiting = /\b(?:(?:not|never|no|don't|do not|cannot|can't|mustn't|must not|shouldn't|should not|nothing|nowhere)(?: ever)?(?: be| go| get| come| put| set| drill| space| torque| bend| pull| make| place| let it be| have| allow)*(?: it| them| rivets| the [a-z]+)?(?: any)? (?:less|fewer|under|below|closer|nearer|over|above|exceed|beyond|past|more|higher|tighter|smaller|larger|bigger|shorter|longer|greater|further|farther|wider)|(?:never|don't|do not|must not|mustn't|shouldn't|should not)\b[^,;:]{1,45}?\b(?:less|under|below|closer|nearer|over|above|beyond|more|tighter|smaller|larger|shorter|longer|further|farther) than)\b/i
const negating = /\b(?:don't|do not|dont|never|avoid|won't|will not|wouldn't|would not|doesn't|does not|isn't|is not|aren't|are not|ain't|can't|cannot|can not|mustn't|must not|shouldn't|should not|wrong|mistake|error|misprint|incorrect|nonsense|myth|false|no longer|not (?:right|enough|correct|ok|okay|fine|good|allowed|the|a|an|for|big|large|long)|fails?|no good|too (?:small|big|large|loose|tight|short|long|close|near|thin|thick|wide|tall|much|little|high|low|far|deep|shallow|few|many|sloppy)|not enough|refuse|reject|beware|forget)\b/i
const negatingNext = /\b(?:not|instead of|rather than|nor|neither|no|in place of|without|as opposed to|unlike|over from|up from|down from)\s+(?:an? |the |by |with |at |to |in |of )?\W*$/i
const supposing = /\b(?:if|unless|suppose|supposing|imagine|whether|had (?:i|you|we))\b/i
const turning = /^\W*(?:but|however|so|actually|instead|use|yet|it's|it is|they're|drill|take|go|make|the right|the correct|correct)\b/i

/** Clauses of a sentence by commas, dashes and turns; offsets within it. */
function clausesOf(sentence: string): { start: number; end: number }[] {
  const clauses: { start: number; end: number }[] = []
  let from = 0
  for (const match of sentence.matchAll(/,(?!\d)|:|\s[-–—]+\s|—|\s(?=(?:but|however|because|whereas|while)\s)|;/gi)) {
    clauses.push({ start: from, end: match.index })
    from = match.index
  }
  clauses.push({ start: from, end: sentence.length })
  return clauses
}

/** What the whole sentence is, or null when nothing in it is a claim. */
export function roleOf(sentence: string, question: boolean): ClaimRole | null {
  if (question || asking.test(sentence)) return null
  return reading.test(sentence) && !shouldMeasure.test(sentence) ? 'measured' : 'advised'
}

/** Marks with the standing their clause gives them. Of a negated, reported or supposed mark nothing is claimed, yet it may say what is spoken of. */
export function withStanding(sentence: string, offset: number, role: ClaimRole, marks: readonly Mark[]): Mark[] {
  if (marks.length === 0) return []
  const plain = sentence.replaceAll('’', "'")
  let isReported = false
  const spans: { start: number; end: number; claimed: boolean; supposed: number }[] = []
  for (const { start, end } of clausesOf(plain)) {
    const clause = plain.slice(start, end)
    if (turning.test(clause.replace(/^[\s,:;–—-]+/, ''))) isReported = false
    isReported ||= reported.test(clause) || (role === 'advised' && finding.test(clause))
    const limited = clause.replace(limiting, (text) => ' '.repeat(text.length))
    spans.push({ start, end, claimed: !isReported && !negating.test(limited), supposed: supposing.exec(clause)?.index ?? Infinity })
  }
  return marks.map((mark) => {
    const at = mark.start - offset
    const span = spans.find(({ end }) => at < end)
    const before = plain.slice(Math.max(0, at - 30), at)
    const claimed = span?.claimed === true && at - span.start < span.supposed && !(negatingNext.test(before) && !limiting.test(before))
    return claimed ? mark : { ...mark, standing: 'subject' }
  })
}

/** The bound a mark is given as: "at least", "no more than". */
export function boundOf(before: string, behind: string): 'least' | 'most' | undefined {
  const front = before.slice(-60).toLowerCase()
  const back = behind.slice(0, 20).toLowerCase()
  if (/\b(?:at least|minimum|min\.?|least|smallest|no less|not less|never less|no closer|not closer|never closer|closer than|nearer than|less than|no nearer|not under|never under|not below|never below|no tighter|no smaller|no fewer|or more)\b[^.;]{0,40}$/.test(front) || /^\W*(?:or more|minimum|at least|min\b|and up|or over)/.test(back)) return 'least'
  if (/\b(?:at most|maximum|max\.?|most|up to|no more|not more|never more|not over|never over|not above|never above|exceed|no further|no farther|no longer than|no higher)\b[^.;]{0,40}$/.test(front) || /^\W*(?:or less|maximum|at most|max\b|tops|or under)/.test(back)) return 'most'
  return undefined
}
