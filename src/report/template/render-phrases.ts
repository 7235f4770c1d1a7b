import type { PhrasingContent } from 'mdast'
import { text } from '../nodes.ts'
import { isDirective } from './directive-node.ts'
import { placeOf } from './place-of.ts'
import type { Rendering } from './render-blocks.ts'
import { VALUES } from './values.ts'

/** Renders running text: values filled in, what only looked like a directive put back as it was written. */
export function renderPhrases(phrases: readonly PhrasingContent[], rendering: Rendering): PhrasingContent[] {
  return joinText(phrases.flatMap((phrase) => renderPhrase(phrase, rendering)))
}

function renderPhrase(phrase: PhrasingContent, rendering: Rendering): PhrasingContent[] {
  if (isDirective(phrase)) {
    if (phrase.name === 'value') return [text(VALUES[phrase.attributes?.of ?? '']!(rendering.audit))]
    return restore(phrase, rendering)
  }
  if (phrase.type === 'html') return []
  const { position: _, ...node } = phrase
  if ('children' in phrase) {
    return [{ ...node, children: renderPhrases(phrase.children, rendering) } as PhrasingContent]
  }
  return [node as PhrasingContent]
}

/** The characters around the label as the template has them, the label itself rendered. */
function restore(phrase: PhrasingContent & { children: PhrasingContent[] }, rendering: Rendering) {
  const { offset, length } = placeOf(phrase)
  const first = phrase.children[0]
  const last = phrase.children.at(-1)
  if (!first || !last) return [text(rendering.text.slice(offset, offset + length))]
  const lastPlace = placeOf(last)
  return [
    text(rendering.text.slice(offset, placeOf(first).offset)),
    ...renderPhrases(phrase.children, rendering),
    text(rendering.text.slice(lastPlace.offset + lastPlace.length, offset + length)),
  ]
}

function joinText(phrases: readonly PhrasingContent[]): PhrasingContent[] {
  const joined: PhrasingContent[] = []
  for (const phrase of phrases) {
    const last = joined.at(-1)
    if (phrase.type === 'text' && last?.type === 'text')
      joined[joined.length - 1] = text(last.value + phrase.value)
    else joined.push(phrase)
  }
  return joined
}
