const LABELS: Readonly<Record<string, string>> = {
  vondrak2011: 'Vondrák 2011',
  laskar2004: 'Laskar 2004',
  laskar1986: 'Laskar 1986',
  p03: 'IAU 2006 (P03)',
  iau1976: 'IAU 1976',
  newcomb1895: 'Newcomb 1895',
}

/** The obliquity model as every table and figure names it; a name without a label is printed as it is. */
export function modelLabel(model: string): string {
  return Object.hasOwn(LABELS, model) ? LABELS[model]! : model
}
