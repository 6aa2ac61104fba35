import { uuidv7 } from 'uuidv7'
import type { Problem } from '#shared/utils/problem'

/**
 * One act that must happen once: what goes on now, and what stopped it. Its id stays the same until the act succeeds,
 * so pressing again after a lost answer acts no second time.
 */
export function useOnce() {
  let mutationId: string | null = null
  const busy = ref<string | false>(false)
  const problem = ref<Problem | null>(null)
  const fields = computed<Record<string, string>>(() => problem.value?.fields ?? {})

  /** Runs the act; null where it was refused or is still going on. */
  async function run<T>(words: string, act: (mutationId: string) => Promise<T>): Promise<T | null> {
    if (busy.value) return null
    busy.value = words
    problem.value = null
    mutationId ??= uuidv7()
    try {
      const outcome = await act(mutationId)
      mutationId = null
      return outcome
    }
    catch (error) {
      problem.value = readProblem(error)
      return null
    }
    finally {
      busy.value = false
    }
  }

  return { busy, problem, fields, run }
}
