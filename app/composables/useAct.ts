import { uuidv7 } from 'uuidv7'
import type { Problem } from '#shared/utils/problem'

interface ActOptions { method?: 'POST' | 'PATCH' | 'PUT' | 'DELETE', /** For acts that carry no mutation id. */ plain?: boolean }

/**
 * One act of a page: sent once, its refusal kept for the page to show, and nothing typed is lost.
 * The same content sent again after a lost answer carries the same mutation id, so the server does it once.
 */
export function useAct() {
  const isBusy = ref(false)
  const problem = ref<Problem | null>(null)
  const signInAgain = useSignInAgain()
  let last = { content: '', id: '' }

  async function act<T = unknown>(url: string, body: Record<string, unknown>, { method = 'POST', plain = false }: ActOptions = {}): Promise<T | null> {
    if (isBusy.value) return null
    isBusy.value = true
    problem.value = null
    const content = JSON.stringify([url, body])
    if (last.content !== content) last = { content, id: uuidv7() }
    try {
      const answer = await callApi<T>(url, { method, body: plain ? body : { mutationId: last.id, ...body } })
      last = { content: '', id: '' }
      return answer
    }
    catch (error) {
      problem.value = readProblem(error)
      if (problem.value.code === 'not-signed-in') signInAgain.value = true
      return null
    }
    finally {
      isBusy.value = false
    }
  }

  /** The sentence beside a field, by its path. */
  const fieldOf = (path: string) => problem.value?.fields?.[path]
  /** The sentence for the whole form: only where no field has one of its own. */
  const sentence = computed(() => problem.value && !Object.keys(problem.value.fields ?? {}).length ? problem.value.message : null)

  return { act, isBusy, problem, fieldOf, sentence, forget: () => problem.value = null }
}
