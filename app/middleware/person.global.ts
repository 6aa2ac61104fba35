/** Brings people without a session to the sign-in page and back afterwards. It guards nothing: the server does. */
const OPEN = /^\/(sign-in|forgotten|welcome|new-password|check|c|help)(\/|$)/

export default defineNuxtRouteMiddleware(async (to) => {
  if (OPEN.test(to.path)) return
  const { me, load } = useMe()
  if (!me.value && !(await load())) return navigateTo({ path: '/sign-in', query: to.path === '/' ? {} : { next: to.fullPath } })
})
