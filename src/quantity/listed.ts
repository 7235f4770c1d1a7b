/** The same, but of more than `most` the rest is counted: `a, b and 3 more`. */
export function listedShort(items: readonly string[], most: number): string {
  if (items.length <= most) return listed(items)
  return listed([...items.slice(0, most), `${items.length - most} more`])
}

/** `a`, `a and b`, `a, b and c`. */
export function listed(items: readonly string[]): string {
  if (items.length < 2) return items.join('')
  return `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`
}
