import type { Me } from '#shared/types/firm'

/** The signed-in person, asked of the server once per page load, or null on pages without a session. */
export function useMe() {
  const me = useState<Me | null>('me', () => null)

  async function load(): Promise<Me | null> {
    me.value = await callApi<Me | null>('/api/me')
    return me.value
  }

  async function signOut(): Promise<void> {
    await callApi('/api/auth/sign-out', { method: 'POST', body: {} })
    me.value = null
    await navigateTo('/sign-in', { external: true })
  }

  return { me, load, signOut }
}
