/** Writes dist/workers/<name>.mjs for every worker of the tree into `outDirectory`; returns the files. */
export function buildWorkers(outDirectory?: string): Promise<string[]>
