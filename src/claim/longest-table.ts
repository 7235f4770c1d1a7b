/** The longest table beside a claim file that is read, characters. */
export const LONGEST_TABLE = 2_000_000
