// What stands at a task: sizes with their sources, stamped know-how, lessons that say the same together, open questions. Their cautions are the task's.
import Link from 'next/link'
import type { Route } from 'next'
import { HowItWent } from '@/components/entries/how-it-went'
import { PlanChanges } from '@/components/entries/plan-changes'
import { DimensionText } from '@/components/shop/dimension-text'
import { StampFlat } from '@/components/stamps/stamp-flat'
import { builderWords } from '@/lib/format/brief-order-words'
import { basisWords, capital } from '@/lib/format/shop-words'
import type { BriefItem, BriefSize, BriefTask, PostLink } from '@/lib/schemas/brief'
import { BriefRow } from './brief-row'

export function SizeRow({ size }: { size: BriefSize }) {
  const { text, source, isLoud } = basisWords(size)
  return (
    <BriefRow label="Size">
      <div className="brief-size">
        <p>{capital(size.claim)}</p>
        <p className="brief-size-value">{/^[#\d.]/u.test(size.expected) ? <DimensionText text={size.expected} /> : size.expected}</p>
        <p className="brief-note brief-size-source">{isLoud ? <b>{text}. </b> : null}{[source, isLoud ? '' : text].filter(Boolean).join(' · ')}  · <Link href={size.url as Route}>{size.tableTitle}</Link> · used in <PostLinks posts={size.posts} /></p>
      </div>
    </BriefRow>
  )
}

export function KnowHowRow({ item }: { item: BriefItem }) {
  return (
    <BriefRow label={item.stamp === 'stamped' ? 'Stamped' : 'One stamp'} aside={<Stamps item={item} />}>
      <h3><Link href={item.url as Route}>{item.title}</Link></h3>
      <PlanChanges changes={item.planChanges} brief />
      <p>{item.passage}</p>
      <HowItWent outcomes={item.outcomes} critical={item.needsTwo} notes />
    </BriefRow>
  )
}

function Stamps({ item }: { item: BriefItem }) {
  return (
    <>
      {item.stamps.map((stamp) => <StampFlat key={stamp.id} stamp={stamp} state={item.stamp} />)}
      {item.missing === null ? null : <p className="brief-missing">{item.missing === 'firm-basis' ? 'Firm basis missing' : 'Second stamp missing'}</p>}
    </>
  )
}

export function LessonRow({ lesson: { lead, builders, others } }: { lesson: BriefTask['lessons'][number] }) {
  return (
    <BriefRow label="Lesson" aside={lead.stamps.length > 0 ? lead.stamps.map((stamp) => <StampFlat key={stamp.id} stamp={stamp} state={lead.stamp} />) : undefined}>
      <h3><Link href={lead.url as Route}>{lead.title}</Link></h3>
      <PlanChanges changes={lead.planChanges} brief />
      <p>{lead.passage}</p>
      <p className="brief-note">
        {lead.author.name}{builders > 1 ? <> · <b>{builderWords(builders)} say so</b></> : null}
        {others.length > 0 ? <>: <PostLinks posts={others} /></> : null}
      </p>
      <HowItWent outcomes={lead.outcomes} critical={lead.needsTwo} notes />
    </BriefRow>
  )
}

export function OpenRow({ item }: { item: BriefItem }) {
  return (
    <BriefRow label="Open">
      <p><Link href={item.url as Route}>{item.title}</Link> <span className="brief-note">Nobody has answered yet. Have you done it?</span></p>
    </BriefRow>
  )
}

function PostLinks({ posts }: { posts: readonly PostLink[] }) {
  return posts.map((post, i) => <span key={post.postId}>{i > 0 ? '; ' : null}<Link href={post.url as Route}>{post.title}</Link></span>)
}
