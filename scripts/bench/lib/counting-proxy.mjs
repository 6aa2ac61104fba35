import { connect, createServer } from 'node:net'

const SSL_REQUEST = 80_877_103

/** The text up to the first zero byte. */
const word = (bytes, from = 0) => bytes.toString('utf8', from, bytes.indexOf(0, from))

/**
 * Reads what one connection sends to PostgreSQL and tells of each statement that is run and each time an answer is waited for.
 * @source PostgreSQL documentation, "Message Formats": a byte for the kind, four for the length; the start-up message has no kind
 */
function statementReader({ onStatement, onWait }) {
  const prepared = new Map()
  let bound = ''
  let rest = Buffer.alloc(0)
  let isStarted = false
  const take = {
    Q: (body) => {
      onStatement(word(body))
      onWait()
    },
    P: body => prepared.set(word(body), word(body, body.indexOf(0) + 1)),
    B: (body) => {
      bound = prepared.get(word(body, body.indexOf(0) + 1)) ?? ''
    },
    E: () => onStatement(bound),
    S: () => onWait(),
  }
  return (chunk) => {
    rest = Buffer.concat([rest, chunk])
    for (;;) {
      const head = isStarted ? 1 : 0
      if (rest.length < head + 4) return
      const end = head + rest.readInt32BE(head)
      if (rest.length < end) return
      const body = rest.subarray(head + 4, end)
      if (!isStarted) isStarted = body.readInt32BE(0) !== SSL_REQUEST
      else take[String.fromCharCode(rest[0])]?.(body)
      rest = rest.subarray(end)
    }
  }
}

/** Stands between the web process and PostgreSQL and counts. `during(act)` answers the statements and waits of that while. */
export async function countingProxy(databaseUrl) {
  const target = new URL(databaseUrl)
  let seen = { statements: [], waits: 0 }
  const server = createServer((front) => {
    const back = connect(Number(target.port || 5432), target.hostname)
    const read = statementReader({ onStatement: text => seen.statements.push(text), onWait: () => seen.waits++ })
    front.on('data', (chunk) => {
      read(chunk)
      back.write(chunk)
    })
    back.on('data', chunk => front.write(chunk))
    for (const [one, other] of [[front, back], [back, front]]) one.on('close', () => other.destroy()).on('error', () => other.destroy())
  })
  await new Promise(resolve => server.listen(0, '127.0.0.1', resolve))
  const url = new URL(databaseUrl)
  url.port = String(server.address().port)
  return {
    url: url.href,
    async during(act) {
      const counted = seen = { statements: [], waits: 0 }
      await act()
      // What comes afterwards belongs to nobody.
      seen = { statements: [], waits: 0 }
      return counted
    },
    close: () => server.close(),
  }
}
