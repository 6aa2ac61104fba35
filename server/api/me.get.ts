import type { Me } from '#shared/types/firm'

/** Who is signed in, or null: the shell asks it on every page. */
export default defineOpenHandler({}, async ({ event }): Promise<Me | null> => {
  const ctx = await signedIn(event)
  if (!ctx) return null
  const { crewId: _, ...me } = ctx.person
  return me
})
