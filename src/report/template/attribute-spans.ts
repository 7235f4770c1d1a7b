/** Where one attribute stands in a text; offsets count from the start of that text. */
export interface AttributeSpan {
  name: string
  nameOffset: number
  valueOffset: number
  valueLength: number
}

const ATTRIBUTE = /([\w.:-]+)[ \t]*=[ \t]*(?:"([^"]*)"|'([^']*)'|([^\s"'{}]+))/dg

/** Finds the attributes of a directive written as `name[label]{a="b"}`, given its first line. */
export function attributeSpans(directive: string): AttributeSpan[] {
  const open = directive.lastIndexOf('{')
  if (open === -1) return []
  return [...directive.slice(open).matchAll(ATTRIBUTE)].map((match) => {
    const spans = match.indices!
    const [start, end] = (spans[2] ?? spans[3] ?? spans[4])!
    return {
      name: match[1]!,
      nameOffset: open + match.index,
      valueOffset: open + start,
      valueLength: end - start,
    }
  })
}
