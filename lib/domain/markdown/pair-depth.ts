// Runs of delimiters, and how deep matched brackets and emphasis nest within a paragraph. An estimate of
// what a parser will build: it knows neither code spans nor escapes, and so counts those too.

interface Opener { kind: string; levels: number; inner: number }

export interface PairDepth {
  /** Takes the next line; returns the longest run on it, all runs of emphasis so far, and the deepest pair of its paragraph so far. */
  next(line: string): { longestRun: number; runs: number; depth: number }
}

const marks = /([*_~`])\1*|[[\]]/g
const isSpace = (character: string | undefined): boolean => character === undefined || /\s/.test(character)
const isWord = (character: string | undefined): boolean => character !== undefined && /[\p{L}\p{N}]/u.test(character)

/** Counts through one text; make a new one for the next. */
export function pairDepth(): PairDepth {
  let open: Opener[] = []
  let waiting = new Map<string, number>()
  let runs = 0
  let depth = 0

  const close = (kind: string, levels: number): boolean => {
    if (!waiting.get(kind)) return false
    let inner = 0
    for (;;) {
      const opener = open.pop()
      if (!opener) return false
      waiting.set(opener.kind, (waiting.get(opener.kind) ?? 1) - 1)
      inner = Math.max(inner, opener.inner)
      if (opener.kind !== kind) continue
      const height = inner + Math.min(levels, opener.levels)
      depth = Math.max(depth, height)
      const outer = open.at(-1)
      if (outer) outer.inner = Math.max(outer.inner, height)
      return true
    }
  }
  const push = (kind: string, levels: number): void => {
    open.push({ kind, levels, inner: 0 })
    waiting.set(kind, (waiting.get(kind) ?? 0) + 1)
  }

  return {
    next(line) {
      let longestRun = 0
      if (line.trim() === '') {
        open = []
        waiting = new Map()
        depth = 0
      }
      for (const match of line.matchAll(marks)) {
        const run = match[0]
        if (run === '[') push('[', 1)
        else if (run === ']') close('[', 1)
        else {
          longestRun = Math.max(longestRun, run.length)
          if (run.startsWith('`')) continue
          runs += 1
          const before = line[match.index - 1]
          const after = line[match.index + run.length]
          const levels = Math.ceil(run.length / 2)
          const kind = run.charAt(0)
          const mayClose = !isSpace(before)
          const mayOpen = !isSpace(after)
          // Between two letters a mark can be either; closing first is what the parsers do.
          if (mayClose && close(kind, levels)) continue
          if (mayOpen && (!mayClose || !isWord(before) || isWord(after))) push(kind, levels)
        }
      }
      return { longestRun, runs, depth }
    },
  }
}
