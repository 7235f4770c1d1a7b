/** A claim file to fill in: an invented place, every key explained, the optional ones as comments. */
export function newClaim(): string {
  return TEMPLATE
}

const TEMPLATE = `# A claim for Datestone. Put your own case in place of the invented one, then run
#   datestone check FILE    to see whether the file is sound
#   datestone audit FILE    to write the audit
#
# Quantities carry their units. Angles as printed: 49°34′18″, 49 34 18, 49.5717°, 10′.
# ± is one standard deviation; a hard limit is written "within 1′". Plain ' and " do for ′ and ″.
# "unknown" may stand for horizon, north, disc, elevation and any uncertainty; the report then says
# what that costs in years. A key with # right before it is optional: delete the # to use it.

# The claim in one sentence, as its source makes it. Put it in quotes if it holds a colon or a #.
claim: The doorway of the Oskendale round house frames midwinter sunset, so it was built about 1900 BCE.

# Where it is printed.
#source: Oskendale Heritage Trail, board 3

structure:
  name: Oskendale round house
  latitude: 54°21′40″ N
  # Nothing is computed from the longitude yet.
  #longitude: 2°48′ W
  # Height above sea level; the air pressure follows from it.
  elevation: 210 m

# Points of the plan on a local grid: metres east and north of any origin. "up" is the height of
# the point, "uncertainty" one standard deviation in each direction.
points:
  hearth: {east: 0 m, north: 0 m, uncertainty: 5 cm}
  door-post: {east: -6.61 m, north: -6.58 m, uncertainty: 5 cm}
  #step: {east: -3 m, north: -2.5 m, up: 0.2 m, uncertainty: unknown}

# How the plan's north was found (compass, gps, sun, plan) and how well; or just: north: unknown
north: {from: compass, uncertainty: 0.5°}

# The lines said to mark something, each with a name: from one point to another, or as a measured
# azimuth (from true north through east). "horizon" is the altitude of the skyline there as the
# eye sees it.
sightlines:
  doorway: {from: hearth, to: door-post, horizon: 1°10′ ± 5′}
  #measured: {azimuth: 225°08′ ± 10′, horizon: unknown}
  # A line may have a target of its own. One example of each kind:
  # - an equinox; "sense" is declination zero, midway in days, midway in direction, or unknown:
  #window: {azimuth: 90°40′ ± 10′, target: {body: sun, event: equinox, sense: unknown, at: rising}}
  # - a day counted from a solstice, after or before it; several make a calendar:
  #marker: {azimuth: 306° ± 10′, target: {body: sun, day: 30 days after june solstice, at: setting}}
  # - the Sun at noon, seen through a shaft: an altitude is measured, and there is no horizon:
  #shaft: {altitude: 11°50′ ± 10′, target: {body: sun, event: december solstice, at: noon}}
  # - the Moon at a standstill: northern or southern, major or minor:
  #gap: {azimuth: 145° ± 10′, target: {body: moon, event: southern major standstill, at: rising}}
  # - a star by its name, Bayer letter (alpha CMa) or number (HR 2491); "altitude" is where it was
  #   sighted, and without it the star is taken where it is first visible:
  #notch: {azimuth: 128° ± 10′, target: {body: Sirius, at: rising, altitude: 3° ± 0.5°}}
  # - a star at its upper or lower culmination: an altitude is measured again:
  #pipe: {altitude: 49° ± 10′, target: {body: Thuban, at: lower culmination}}
  # - two stars one above the other; without "above" either may be the upper one:
  #axis: {azimuth: 1°20′ ± 10′, target: {bodies: [Kochab, Mizar], event: one above the other, above: Mizar}}

# What the lines mark that have no target of their own. The event is june solstice, december solstice,
# equinox or zenith passage, at rising, setting or noon; "disc" is the part of the Sun or Moon that
# stands on the skyline: upper limb, centre, lower limb, or 2′ showing.
target: {body: sun, event: december solstice, at: setting, disc: upper limb}

# The date the claim asserts: 1900 BCE ± 100, AD 600, 2500 to 2300 BCE, c. 400 CE, 3200 cal BP,
# 3rd century BCE. "c." without ± is taken as ± 50 years.
asserted_date: 1900 BCE ± 100

# How exactly the claim says they built: exact, or an angle.
#assumed_precision: exact

# The build tolerances to sweep over: what you think possible for these builders.
#plausible_precision: 10′ to 1°

# Dates from other evidence, to hold the asserted one against.
#other_dates:
  #- {label: radiocarbon, date: 800 to 500 BCE}
  #- {label: pottery, date: 3rd century BCE}

# The dates thought possible at all.
#window: 20001 BCE to 2026 CE

# The air at the place. With "refraction" (as the claim took it, less parallax) the rest is not used.
#atmosphere:
  #temperature: 10 °C
  #pressure: 988 hPa
  #humidity: 40 %
  #lapse: 6.5 K/km
  #refraction_uncertainty: 3′
  #refraction: 27′20″

# Intermediate results that the source prints; each step is checked apart.
#claimed:
  #azimuth: 225°08′
  #altitude: 0°45′
  #refraction: 24′
  #semidiameter: 16′
  #declination: −23°53′
  #obliquity: 23°53′

# The obliquity formula behind the claim: vondrak2011, laskar2004, laskar1986, p03, iau1976,
# newcomb1895, or the author and year of another table.
#formula: newcomb1895

# Build tolerances that the tables must include.
#tolerances: [5′, 10′, 20′]

# Remarks to print in the report, in Markdown: paragraphs, emphasis, lists, links, code, quotations.
#notes: |
  #The plan was drawn in 1987; the door post has since been reset.
`
