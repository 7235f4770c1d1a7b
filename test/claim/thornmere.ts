/** The example of the file format: an invented place. */
export const THORNMERE = `claim: The east pillar of the Thornmere court marked midsummer sunrise exactly, so the court was built in 9600 BCE.
source: Thornmere visitor leaflet, third printing, page 4
structure:
  name: Thornmere court
  latitude: 41°16′12″ N
  longitude: 23°05′ E
  elevation: 640 m
points:
  hearthstone: {east: 0 m, north: 0 m, uncertainty: 3 cm}
  east-pillar: {east: 84.65 m, north: 53.09 m, up: 0.4 m, uncertainty: 5 cm}
sightlines:
  midsummer: {from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2′}
target: {body: sun, event: june solstice, at: rising, disc: upper limb}
asserted_date: 9600 BCE ± 100
assumed_precision: exact
plausible_precision: 10′ to 1°
other_dates:
  - {label: radiocarbon, date: 800 BCE to 500 BCE}
`

/** The same file with one stretch of text changed; the stretch has to be there, and once. */
export function thornmereWith(from: string, to: string): string {
  const parts = THORNMERE.split(from)
  if (parts.length !== 2) throw new Error(`${JSON.stringify(from)} is there ${parts.length - 1} times`)
  return parts.join(to)
}

/** The same file with lines added at its end. */
export function thornmereAnd(lines: string): string {
  return `${THORNMERE}${lines}\n`
}
