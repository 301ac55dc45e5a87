// The cautions of a post that is only named: signal words and topics in one line, as beside a link.
import type { Caution } from '@/lib/schemas/post'

type Mentioned = Pick<Caution, 'code' | 'signalWord' | 'title'>
const order: readonly Caution['signalWord'][] = ['WARNING', 'CAUTION', 'NOTICE']

export function CautionMention({ cautions }: { cautions: readonly Mentioned[] }) {
  if (cautions.length === 0) return null
  return (
    <span className="caution-mention">
      {order.map((word) => ({ word, titles: [...new Set(cautions.filter((c) => c.signalWord === word).map((c) => c.title))] })).filter(({ titles }) => titles.length > 0)
        .map(({ word, titles }) => <span key={word}><b>{word}</b> {titles.join(', ')} </span>)}
    </span>
  )
}
