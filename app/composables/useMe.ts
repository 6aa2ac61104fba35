/** Who is signed in, as the shell shows it. */
export interface Me { id: string, name: string, roles: string[], firmName: string }

/** The signed-in person, or null on pages without a session. */
export function useMe() {
  const me = useState<Me | null>('me', () => null)
  async function signOut() {
    me.value = null
    await navigateTo('/sign-in')
  }
  return { me, signOut }
}
