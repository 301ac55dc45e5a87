// The mark: a primer square (the sheet), a ring (the final hole) and a dot in it (the pilot hole). No cross hairs.

export function Mark() {
  return (
    <svg className="mark flex-none" viewBox="0 0 36 36" width="36" height="36" aria-hidden="true" focusable="false">
      <rect className="fill-primer" width="36" height="36" rx="2" />
      <circle className="fill-none stroke-on-primer" cx="18" cy="18" r="9.5" strokeWidth="3.2" />
      <circle className="fill-on-primer" cx="18" cy="18" r="3.4" />
    </svg>
  )
}
