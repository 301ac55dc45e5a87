// What passes between the renderer and its worker thread.

export interface RenderRequest { id: number; fields: Record<string, string> }

/** `ready` comes once, after warming up; `started` names the field at work, so that a timeout can be laid to it. */
export type RenderReport =
  | { type: 'ready' }
  | { type: 'started'; id: number; field: string }
  | { type: 'done'; id: number; html: Record<string, string>; plain: Record<string, string> }
  | { type: 'failed'; id: number; field: string; reason: string }
