/** A failure that a person can mend: one line, what failed and how to mend it, no stack. */
export class Mendable extends Error {
  /**
   * @param {string} what what failed, without a full stop
   * @param {string} mend what to do about it
   * @param {string} [detail] output worth showing above the line
   */
  constructor(what, mend, detail = '') {
    super(`${what} — ${mend}`)
    this.detail = detail
  }
}

const seconds = ms => `${(ms / 1000).toFixed(1)} s`

/** Prints one line. */
export function say(line = '') {
  process.stdout.write(`${line}\n`)
}

/** Prints one padded progress line: what, how it went, how long it took. */
export function sayStep(what, outcome, ms) {
  say(`  ${what.padEnd(22)} ${outcome.padEnd(44)} ${ms === undefined ? '' : seconds(ms)}`.trimEnd())
}

/**
 * Runs one step and prints its line with the time it took.
 * The work returns the words for the line, or nothing for "done".
 */
export async function step(what, work) {
  const began = performance.now()
  const outcome = await work()
  sayStep(what, typeof outcome === 'string' ? outcome : 'done', performance.now() - began)
  return outcome
}

/** Prints a failure: one line when it is mendable, with its stack when it is a fault of ours. */
export function sayFailure(error) {
  if (error instanceof Mendable) {
    if (error.detail) process.stderr.write(`${error.detail.trimEnd()}\n`)
    process.stderr.write(`\n${error.message}\n`)
    return
  }
  process.stderr.write(`\n${error?.stack ?? error}\n`)
}
