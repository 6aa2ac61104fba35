/** Progress: on stderr, so that stdout holds figures alone. */
export const note = line => process.stderr.write(`  ${line}\n`)
