// The one barrel: every table by its area.
export * from './people'
export * from './kits'
export * from './posts'
export * from './stamps'
export * from './cautions'
export * from './builds'
export * from './records'
export * from './relations'
