/** Where the repository lies. */
export const root: string;

/** Builds client and server into dist, unless they were built from these very sources. */
export function buildIfNeeded(): Promise<void>;
