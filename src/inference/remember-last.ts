/** The same function of a year, which does not repeat its work when it is asked about one year several times running. */
export function rememberLast<T>(f: (year: number) => T): (year: number) => T {
  let last: { year: number; value: T } | null = null
  return (year) => {
    if (last === null || last.year !== year) last = { year, value: f(year) }
    return last.value
  }
}
