const LONE_RETURN = /\r(?!\n)/g

/** Where a carriage return stands without its line feed, as in the files of old Macintoshes; -1 for nowhere. */
export function findLoneReturn(text: string): number {
  return text.search(LONE_RETURN)
}

/** The same text, of the same length, with a line feed in place of each lone carriage return. */
export function withLineFeeds(text: string): string {
  return text.replace(LONE_RETURN, '\n')
}
