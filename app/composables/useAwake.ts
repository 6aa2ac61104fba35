/**
 * Whether the page's script runs yet. Until then a form must not be sent by the browser itself: that would put what was
 * typed, a password even, into the address. Its button is no submit button before.
 */
export function useAwake() {
  const isAwake = ref(false)
  onMounted(() => isAwake.value = true)
  return isAwake
}
