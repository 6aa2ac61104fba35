import type { Ref } from 'vue'

/** Scrolls a sideways list so that its current item is in sight, at first and after each move; the page itself does not move. */
export function useCurrentInView(list: Readonly<Ref<HTMLElement | null>>) {
  const route = useRoute()
  const show = () => {
    const current = list.value?.querySelector<HTMLElement>('[aria-current]')
    if (list.value && current) list.value.scrollLeft = current.offsetLeft - (list.value.clientWidth - current.offsetWidth) / 2
  }
  onMounted(show)
  watch(() => route.path, show, { flush: 'post' })
}
