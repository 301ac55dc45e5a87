// The notes of a figure, keyed by balloon number; on a page of results each also says which posts below speak of it.
import type { Balloon } from '@/lib/domain/shop/figures/figure'
import { BalloonNumber } from './figure-balloon'

/** A post further down the page that is about a balloon. */
export interface KeyedPost {
  balloons: readonly number[]
  title: string
  /** The id of its row on the page. */
  anchor: string
}

export interface BalloonNotesProps {
  balloons: readonly Pick<Balloon, 'n' | 'label' | 'note'>[]
  /** In the order they stand on the page. */
  posts?: readonly KeyedPost[] | undefined
}

export function BalloonNotes({ balloons, posts = [] }: BalloonNotesProps) {
  if (balloons.length === 0) return null
  return (
    <ol className="balloon-notes">
      {balloons.map(({ n, label, note }) => (
        <li key={n}>
          <BalloonNumber n={n} />
          <span><b>{label}</b> <span className="balloon-note">{note}</span><PostsAbout posts={posts.filter((post) => post.balloons.includes(n))} /></span>
        </li>
      ))}
    </ol>
  )
}

/** One line, so that the hits stay near; what they are called is for whoever cannot see the balloons beside them. */
function PostsAbout({ posts }: { posts: readonly KeyedPost[] }) {
  const [first] = posts
  if (!first) return null
  return <a className="balloon-posts" href={`#${first.anchor}`}>{posts.length === 1 ? '1 post' : `${posts.length} posts`} below<span className="sr-only">: {posts.map(({ title }) => title).join('; ')}</span></a>
}
