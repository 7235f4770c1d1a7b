const LONGEST = 60

/**
 * The value in backticks, fit for a one-line message: control characters shown as symbols, a backtick as an
 * apostrophe, and the middle of a long value left out.
 */
export function quoted(value: string): string {
  const characters = [...visibleControls(value).replaceAll('`', '’')]
  if (characters.length <= LONGEST) return `\`${characters.join('')}\``
  return `\`${characters.slice(0, LONGEST - 15).join('')}…${characters.slice(-14).join('')}\``
}

/** The same text with control and direction-changing characters replaced, so that no terminal acts on them. */
export function visibleControls(text: string): string {
  return text.replace(/[\p{Cc}\u2028\u2029\u202a-\u202e\u2066-\u2069]/gu, (character) => {
    const code = character.charCodeAt(0)
    return code < 0x20 ? String.fromCharCode(0x2400 + code) : '�'
  })
}
