// Words that say nothing about what a text is about: they are neither indexed nor searched.
// Question words and words of order belong to them: "which hole first" is looked up by "hole".

const words = `
a about above after again ahead all almost along also although always am among an and another any anybody anyone anything are aren't around as at
away be because been before being below best better between both but by came can can't cannot come could couldn't did didn't do does
doesn't doing don't done down during each either else enough etc even ever every everything few for from further get gets getting give go goes going gone got
had hadn't has hasn't have haven't having he her here hers him his how however i i'd i'll i'm i've if in instead into is isn't it it'd it'll it's its itself
just know known let like likely made make makes making many may maybe me might mine more most much must my myself near need needs neither never no nobody
none nor not nothing now of often oh ok on once one ones only onto or other others otherwise ought our ours out over own per perhaps
please prior put quite rather really rid same say says see seem seems she should shouldn't show since so some somebody someone something soon still such
than thanks that that's the their theirs them themselves then there there's these they they'd they'll they're they've thing things this those though through
thus to together too toward towards try trying under until up upon us use used uses using usual usually very via want wants was wasn't way we we'd we'll we're
we've well went were weren't what what's whatever when where where's whether which while who whom whose why will wish with within without won't
would wouldn't yes yet you you'd you'll you're you've your yours yourself anyway
`

const stopWords = new Set(words.trim().split(/\s+/).flatMap((word) => [word, word.replaceAll("'", '')]))

/** True for a normalised (lower-case) word that is not searched. */
export function isStopWord(word: string): boolean {
  return stopWords.has(word)
}
