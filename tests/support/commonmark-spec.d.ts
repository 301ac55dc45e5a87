// The package carries no types: the examples of the CommonMark specification, as it prints them.
declare module 'commonmark-spec' {
  export const tests: readonly { markdown: string; html: string; section: string; number: number }[]
}
