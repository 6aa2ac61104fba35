/**
 * One calculation from outside: `npm run --silent calc -- <name> [file]` reads an object (or an array of objects) as JSON
 * from the file or from standard input, and prints the answer as JSON on standard output, nothing else. `list` prints
 * every name with its purpose and input schema. Exit status 2: the input, the JSON or the name was refused.
 */
import { readFile } from 'node:fs/promises'
import { createJiti } from 'jiti'

const REFUSED = 2

const jiti = createJiti(import.meta.url)
const { answerCalculation, findCalculation, listCalculations } = await jiti.import('../shared/calculations/answer-calculation.ts')

function print(value) {
  process.stdout.write(`${JSON.stringify(value, null, 2)}\n`)
}

function refuse(message) {
  print({ error: { message, issues: [{ path: '', message }] } })
  process.exitCode = REFUSED
}

function finish({ isAnswered, reply }) {
  print(reply)
  if (!isAnswered) process.exitCode = REFUSED
}

async function readStandardInput() {
  let text = ''
  process.stdin.setEncoding('utf8')
  for await (const chunk of process.stdin) text += chunk
  return text
}

async function readInput(file) {
  try {
    return { text: file === undefined ? await readStandardInput() : await readFile(file, 'utf8') }
  }
  catch {
    return { problem: `The file ${file} cannot be read.` }
  }
}

async function main([name, file]) {
  if (name === undefined) return refuse('Name the calculation, or "list" for all names.')
  if (name === 'list') return print(listCalculations())
  // An unknown name is refused before anything is read, so that nobody types an object for nothing.
  if (!findCalculation(name)) return finish(answerCalculation(name, null))
  const input = await readInput(file)
  if (input.problem) return refuse(input.problem)
  let body
  try {
    // A byte-order mark is what some editors put before the first brace.
    body = JSON.parse(input.text.replace(/^\uFEFF/, ''))
  }
  catch {
    return refuse('This is not JSON. Give one object, or an array of objects.')
  }
  finish(answerCalculation(name, body))
}

await main(process.argv.slice(2))
