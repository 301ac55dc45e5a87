// The options under the search line: what completes the words, then what was found. Links, in two groups of one listbox.
import type { Route } from 'next'
import Link from 'next/link'
import { CautionWord, gravestWord, type SignalWord } from '@/components/cautions/caution-word'
import { MarkedSnippet } from '@/components/entries/marked-snippet'
import { hitKindLine } from '@/lib/format/kind-line'
import type { Hit, Suggestion } from '@/lib/schemas/search'

export type LiveOption = { id: string; url: string } & ({ suggestion: Suggestion } | { hit: Hit })

interface LiveOptionsProps { listId: string; options: readonly LiveOption[]; activeId: string | null; onPick: () => void }

/** At least one option: an empty listbox is none. */
export function LiveOptions({ listId, options, activeId, onPick }: LiveOptionsProps) {
  const groups = [
    { name: 'Suggestions', options: options.filter((option) => 'suggestion' in option) },
    { name: 'Results', options: options.filter((option) => 'hit' in option) },
  ].filter((group) => group.options.length > 0)
  return (
    <div role="listbox" aria-label="Suggestions and results" id={listId}>
      {groups.map((group) => (
        <div key={group.name} role="group" aria-label={group.name} className="live-group">
          {group.options.map((option) => (
            <Link key={option.id} id={option.id} role="option" aria-selected={option.id === activeId} href={option.url as Route} tabIndex={-1} onClick={onPick}
              className={'hit' in option ? 'live-hit' : 'live-suggestion'}>
              {'hit' in option ? <HitWords hit={option.hit} /> : <SuggestionWords suggestion={option.suggestion} />}
            </Link>
          ))}
        </div>
      ))}
    </div>
  )
}

const kinds: Partial<Record<Suggestion['kind'], string>> = { shop: 'shop table', section: 'section', operation: 'operation' }

function SuggestionWords({ suggestion: { text, kind, cautions } }: { suggestion: Suggestion }) {
  const topics = [...new Set(cautions.map((c) => topicWords(c.topic)))]
  return (
    <>
      <span className="live-words"><span>{kind === 'shop' ? <NumberWords text={text} /> : <b>{text}</b>}</span> <span className="live-kind">{kinds[kind]}</span></span>
      {topics.length > 0 ? <Cautions words={cautions.map((c) => c.signalWord)} text={topics.join(', ')} /> : null}
    </>
  )
}

/** "5/8 in: a grommet with a 3/8 bore (from memory …)": the number stands out, what it is of and whose it is are read with it. */
function NumberWords({ text }: { text: string }) {
  const colon = text.indexOf(': ')
  return colon < 0 ? <b>{text}</b> : <><b>{text.slice(0, colon + 1)}</b>{text.slice(colon + 1)}</>
}

function HitWords({ hit }: { hit: Hit }) {
  const standing = hit.cautions.filter((c) => !c.waived)
  return (
    <>
      <span className="label">{hitKindLine(hit)}</span>
      <b>{hit.title}</b>
      {standing.length > 0 ? <Cautions words={standing.map((c) => c.signalWord)} text={[...new Set(standing.map((c) => c.title))].join(', ')} /> : null}
      <span className="live-snippet"><MarkedSnippet text={hit.snippet} marks={hit.marks} /></span>
    </>
  )
}

function Cautions({ words, text }: { words: readonly SignalWord[]; text: string }) {
  return <span className="live-caution"><CautionWord word={gravestWord(words)} /> {text}</span>
}

const topicWords = (topic: string): string => topic.replaceAll('-', ' ').replace(/^./, (letter) => letter.toUpperCase())
