type Point = readonly [x: number, y: number]

/** The part of a polygon that lies between two heights (Sutherland & Hodgman 1974, at two edges); may be empty. */
export function clipPolygon(polygon: readonly Point[], top: number, bottom: number): Point[] {
  return cutAt(
    cutAt(polygon, top, (y) => y >= top),
    bottom,
    (y) => y <= bottom,
  )
}

function cutAt(polygon: readonly Point[], height: number, isIn: (y: number) => boolean): Point[] {
  return polygon.flatMap((to, index) => {
    const from = polygon.at(index - 1)!
    const crosses = isIn(from[1]) !== isIn(to[1])
    const share = (height - from[1]) / (to[1] - from[1])
    const cut = crosses ? [[from[0] + share * (to[0] - from[0]), height] as const] : []
    return isIn(to[1]) ? [...cut, to] : cut
  })
}
