/** Password hashing is heavy by intent (128 MiB a hash), so at most two run at once and the rest wait their turn. */
const MOST_AT_ONCE = 2
let running = 0
const queue: (() => void)[] = []

export async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= MOST_AT_ONCE) await new Promise<void>(resolve => queue.push(resolve))
  running += 1
  try {
    return await work()
  }
  finally {
    running -= 1
    queue.shift()?.()
  }
}
