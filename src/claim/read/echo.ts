import { isMap, isScalar, isSeq, type Node } from 'yaml'

/** The content of a node as plain JSON values. A number that JSON would print otherwise stays as it is written. */
export function echoNode(node: unknown): unknown {
  if (isMap(node))
    return Object.fromEntries(node.items.map(({ key, value }) => [nameOf(key), echoNode(value)]))
  if (isSeq(node)) return node.items.map(echoNode)
  if (!isScalar(node)) return null
  const { value, source } = node
  if (typeof value === 'number' && String(value) !== source) return source ?? null
  return value
}

function nameOf(key: unknown): string {
  return isScalar(key as Node) ? String((key as { value: unknown }).value) : ''
}
