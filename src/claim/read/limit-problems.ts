import type { Problem } from '../../quantity/problem.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { ProblemCode } from '../problem-codes.ts'

const MOST = 100
/** Of a file beside the claim file: what is wrong with a table is mostly wrong in every row. */
const MOST_BESIDE = 20

const TOO_MANY: ProblemCode = 'too-many-problems'

/** The first problems of a claim file and of each file beside it, the others counted: a file of another kind has thousands. */
export function limitProblems(problems: readonly Problem[]): Problem[] {
  const kept: Problem[] = []
  const seen = new Map<string | undefined, number>()
  for (const problem of problems) {
    const file = problem.beside?.path
    const most = file === undefined ? MOST : MOST_BESIDE
    const before = seen.get(file) ?? 0
    seen.set(file, before + 1)
    if (before < most) kept.push(problem)
    if (before === most)
      kept.push(counted(problem, problems.filter(({ beside }) => beside?.path === file).slice(most)))
  }
  return kept
}

function counted(first: Problem, rest: readonly Problem[]): Problem {
  const file = first.beside?.path
  return {
    ...first,
    severity: rest.some(({ severity }) => severity === 'error') ? 'error' : 'warning',
    code: TOO_MANY,
    message: `${file === undefined ? 'the file' : quoted(file)} has ${rest.length} more problems from here on`,
    expected: 'a file with fewer: put the first ones right',
    suggestion: null,
    path: null,
  }
}
