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
  # Needed where a compass is to be corrected for the date of its survey.
  #longitude: 2°48′ W
  # Height above sea level; the air pressure follows from it.
  elevation: 210 m

# Points of the plan: metres east and north of any origin. "up" is the height of the point above that
# origin, "uncertainty" one standard deviation in each direction; one for all points that state none
# may stand beside them. More points can come from a table beside this file:
#   points: {file: survey.csv, uncertainty: 5 cm}
# with the columns name, east, north (metres), or name, latitude, longitude (degrees), or name, easting,
# northing; up or elevation, uncertainty, width and form may follow.
points:
  hearth: {east: 0 m, north: 0 m, uncertainty: 5 cm}
  door-post: {east: -6.61 m, north: -6.58 m, uncertainty: 5 cm}
  #step: {east: -3 m, north: -2.5 m, up: 0.2 m, uncertainty: unknown}
  # What has a width across the line is a post or a gap:
  #entrance: {east: -6.61 m, north: -5.93 m, width: 1.3 m, form: gap}
  # Points far off may be in latitude and longitude (WGS 84), or on a projected grid (see "grid"). One
  # point of the plan with a latitude and longitude besides ties the plan to them:
  #corner: {east: 2 m, north: 0 m, latitude: 54°21′40.0″ N, longitude: 2°48′00.0″ W}
  #cairn: {latitude: 54°19′21.5″ N, longitude: 2°52′04.2″ W, elevation: 531 m, uncertainty: 5 m}
  #trig-pillar: {easting: 510702.4 m, northing: 6021815.2 m, elevation: 402.1 m}

# The grid of points with an easting and a northing: a zone of UTM, N or S of the equator, on WGS84 or
# another ellipsoid, such as {zone: UTM 30 N, ellipsoid: GRS80}; or the whole projection,
#   {central_meridian: 2° W, latitude_of_origin: 49° N, scale: 0.9996012717, false_easting: 400 km,
#   ellipsoid: Airy 1830, false_northing: -100 km},
# or no more than by how much its north lies off true north, {convergence: 1°35′ W ± 1′}.
#grid: {zone: UTM 30 N}

# How the plan's north was found and how well. Of a compass: the date of the survey, or the declination
# taken off ("applied"), or to be taken off ("declination: 3°20′ W ± 10′"). Other ways:
#   north: {from: gps, baseline: 60 m, accuracy: 2 cm}     two receivers so far apart
#   north: {from: sun}   north: {from: star}   north: {from: plan}   north: {from: grid, convergence: 1°35′ W}
#   north: {from: compass, date: 12 June 2019}   north: unknown
north: {from: compass, declination: applied, uncertainty: 0.5°}

# The lines said to mark something, each with a name: from one point to another, or as a measured
# azimuth (from true north through east). "horizon" is the altitude of the skyline there as the
# eye sees it.
sightlines:
  doorway: {from: hearth, to: door-post, horizon: 1°10′ ± 5′}
  # Of a post or a gap it may be told what of it is sighted: axis, left edge, right edge (of a post); middle,
  # left side, right side (of a gap), as one looks along the line; or both ends: {from: …, to: …}.
  #jamb: {from: hearth, to: entrance, sighted: left side}
  # The skyline may be told by its distance and how much it rises above the eye; by a point with a height;
  # as the open sea, from a height of the eye; or by a table beside this file with the columns azimuth,
  # altitude, uncertainty in degrees: horizon: {profile: skyline.csv}
  #pass: {azimuth: 223°40′ ± 10′, horizon: {distance: 8 km ± 100 m, rise: 120 m ± 5 m}}
  #fell: {from: trig-pillar, to: cairn, horizon: {point: cairn}}
  #shore: {azimuth: 228°30′ ± 10′, horizon: {sea: 25 m}}
  #measured: {azimuth: 225°08′ ± 10′, horizon: unknown}
  # A line may have a target of its own. One example of each kind:
  # - both solstices, between which an angle is measured, or lie two points seen from a third:
  #   span: {from: hearth, june: gate, december: door-post}
  #both: {span: {angle: 88°10′ ± 5′, horizons: {june: 1°30′ ± 2′, december: unknown}},
    #target: {body: sun, event: june to december solstice, at: rising}}
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
