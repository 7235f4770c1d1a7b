import type { Heading, Root } from 'mdast'

/** Numbers sections (depth 2) and subsections (depth 3) in order: 1, 1.1, 1.2, 2. Others have none. */
export function headingNumbers(tree: Root): (heading: Heading) => string {
  const numbers = new Map<Heading, string>()
  let [section, subsection] = [0, 0]
  for (const node of tree.children) {
    if (node.type !== 'heading') continue
    if (node.depth === 2) {
      section += 1
      subsection = 0
      numbers.set(node, `${section}`)
    } else if (node.depth === 3 && section > 0) {
      subsection += 1
      numbers.set(node, `${section}.${subsection}`)
    }
  }
  return (heading) => numbers.get(heading) ?? ''
}
