/** A claim with points, horizons and lines of every kind about an invented place. */
export const SURVEY = `claim: The notch beside the peak marked midwinter sunrise, so the ring was built in 2100 BCE.
structure: {name: Harrow ring, latitude: 41°16′12″ N, longitude: 23°05′ E}
north: {from: sun}
grid: {zone: UTM 34 N}
points:
  hearth: {east: 0 m, north: 0 m, up: 1.2 m, latitude: 41°16′12.0″ N, longitude: 23°05′00.0″ E}
  pillar: {east: 84.65 m, north: 53.09 m, up: 0.4 m, width: 60 cm}
  gate: {east: 12 m, north: -8 m, width: 2.1 m, form: gap}
  peak: {latitude: 41°12′03.6″ N, longitude: 23°15′12.4″ E, elevation: 1420 m, uncertainty: 10 m}
  cairn: {easting: 674512.297 m, northing: 4570889.777 m, elevation: 610 m}
sightlines:
  edge: {from: hearth, to: pillar, sighted: left edge, horizon: {distance: 8 km ± 100 m, rise: 120 m ± 5 m}}
  notch: {from: cairn, to: peak, horizon: {point: peak}}
  shore: {azimuth: 121° ± 5′, horizon: {sea: 25 m}}
  skyline: {azimuth: 122° ± 5′, horizon: {profile: skyline.csv}}
  both: {span: {angle: 61° ± 5′}, target: {body: sun, event: june to december solstice, at: rising}}
target: {body: sun, event: december solstice, at: rising}
asserted_date: 2100 BCE ± 100
`

export const SKYLINE = 'azimuth,altitude\n118,1.5\n121.5,2\n125,0.75\n'

/** The file that the claim names. */
export const BESIDE = { 'skyline.csv': SKYLINE }

export const POINTS = 'name,east,north\nwell,3,4\nstone,-12.5,7.25\n'

/** The same file with one stretch of text changed; the stretch has to be there, and once. */
export function surveyWith(from: string, to: string): string {
  const parts = SURVEY.split(from)
  if (parts.length !== 2) throw new Error(`${JSON.stringify(from)} is there ${parts.length - 1} times`)
  return parts.join(to)
}

/** The same file with a table of points beside its own. */
export const SURVEY_AND_TABLE = surveyWith('points:\n', 'points:\n  file: survey.csv\n')
