import type { WatchSource } from 'vue'
import type { Problem } from '#shared/utils/problem'

/**
 * One question of a page to the server: its answer, or the refusal to show in its place. The page stays as it was while
 * a newer answer is on its way. A session that ran out opens the sign-in over the page and asks again afterwards.
 */
export function useAnswer<T>(key: string, ask: () => Promise<T>, watching: WatchSource[] = []) {
  const signInAgain = useSignInAgain()
  const asked = useAsyncData(key, async () => {
    try {
      return { answer: await ask(), problem: null }
    }
    catch (error) {
      return { answer: null, problem: readProblem(error) }
    }
  }, { watch: watching, lazy: true })
  // Everything is set up before the wait: after it, a composable has lost the component it belongs to.
  const { data, status, refresh } = asked

  watch(() => data.value?.problem?.code, code => code === 'not-signed-in' && (signInAgain.value = true))
  watch(signInAgain, isOpen => !isOpen && data.value?.problem?.code === 'not-signed-in' && refresh())

  const result = {
    answer: computed(() => (data.value?.answer ?? null) as T | null),
    problem: computed<Problem | null>(() => data.value?.problem ?? null),
    isAsking: computed(() => status.value === 'pending'),
    again: () => refresh(),
  }
  return asked.then(() => result)
}
