// 'Rev B', kept on one line and read in full.

export function RevisionLetter({ revision }: { revision: string }) {
  return <span className="whole"><abbr title="Revision" className="no-underline">Rev</abbr> {revision}</span>
}
