const EVERY_MS = 1_500
const MOST_LOOKS = 40

/** Looks again and again until something has come true, for about a minute; stops when the page is left. */
export function useUntil() {
  const isLate = ref(false)
  let run = 0
  onBeforeUnmount(() => run++)

  async function watchFor(isTrue: () => boolean, look: () => Promise<unknown>): Promise<void> {
    const mine = ++run
    isLate.value = false
    for (let looks = 0; looks < MOST_LOOKS && !isTrue(); looks++) {
      await new Promise(resolve => setTimeout(resolve, EVERY_MS))
      if (mine !== run) return
      // A look that fails is followed by the next.
      await look().catch(() => null)
    }
    isLate.value = mine === run && !isTrue()
  }

  return { isLate, watchFor }
}
