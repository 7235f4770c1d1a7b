/**
 * Finds a star by what a claim calls it: its number in the Bright Star Catalogue (HR), or else what may have been
 * meant, likeliest first. Handed in by the caller, since the reader of claim files knows no catalogue.
 */
export type StarFinder = (text: string) => { hr: number } | { suggestions: readonly string[] }
