import type { Vector } from './long-term-poles.ts'

/** Rows of a rotation: the axes of the frame turned to, in the frame turned from. */
export type Matrix = readonly [Vector, Vector, Vector]

export function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
}

export function cross(a: Vector, b: Vector): Vector {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]]
}

/** a + scale · b. */
export function plus(a: Vector, b: Vector, scale: number): Vector {
  return [a[0] + scale * b[0], a[1] + scale * b[1], a[2] + scale * b[2]]
}

export function times(a: Vector, scale: number): Vector {
  return [scale * a[0], scale * a[1], scale * a[2]]
}

export function lengthOf(a: Vector): number {
  return Math.sqrt(dot(a, a))
}

/** The vector of length 1 in the same direction. */
export function unit(a: Vector): Vector {
  return times(a, 1 / lengthOf(a))
}

/** A vector of the frame turned from, in the frame turned to. */
export function turn(matrix: Matrix, vector: Vector): Vector {
  return [dot(matrix[0], vector), dot(matrix[1], vector), dot(matrix[2], vector)]
}
