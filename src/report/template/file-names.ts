/**
 * Names for the files of one kind of figure: `track` where there is one, else `track-midsummer`, from what is
 * left of each label in the letters a to z; never two alike.
 */
export function fileNames(kind: string, labels: readonly string[]): string[] {
  if (labels.length === 1) return [kind]
  const taken = new Set<string>()
  return labels.map((label, index) => {
    const plain = plainLabel(label)
    const wanted = plain === '' ? `${kind}-${index + 1}` : `${kind}-${plain}`
    const name = taken.has(wanted) ? `${wanted}-${index + 1}` : wanted
    taken.add(name)
    return name
  })
}

function plainLabel(label: string): string {
  return label
    .normalize('NFD')
    .toLowerCase()
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 40)
    .replace(/^-+|-+$/g, '')
}
