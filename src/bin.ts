#!/usr/bin/env node
import { runCli } from './cli.ts'

process.exitCode = await runCli(process.argv.slice(2), {
  stdout: process.stdout,
  stderr: process.stderr,
  color: process.stderr.isTTY === true && process.env.NO_COLOR === undefined,
  now: clock(),
})

/** The clock, or the moment that a reproducible build names (reproducible-builds.org, SOURCE_DATE_EPOCH). */
function clock(): Date {
  const epoch = process.env.SOURCE_DATE_EPOCH
  return epoch !== undefined && /^\d{1,12}$/.test(epoch) ? new Date(Number(epoch) * 1000) : new Date()
}
