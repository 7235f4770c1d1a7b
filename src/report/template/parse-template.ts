import type { Root } from 'mdast'
import remarkDirective from 'remark-directive'
import remarkGfm from 'remark-gfm'
import remarkParse from 'remark-parse'
import { unified } from 'unified'

/** Reads Markdown (CommonMark, GFM tables) with directives. Every node keeps its position in the text. */
export function parseTemplate(text: string): Root {
  return unified().use(remarkParse).use(remarkGfm, { singleTilde: false }).use(remarkDirective).parse(text)
}
