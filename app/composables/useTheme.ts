export const THEMES = ['light', 'sun', 'dark'] as const
export type Theme = (typeof THEMES)[number]
export const THEME_WORDS: Record<Theme, string> = { light: 'Light', sun: 'Sun', dark: 'Dark' }

const isTheme = (value: unknown): value is Theme => THEMES.some(theme => theme === value)
const A_YEAR = 60 * 60 * 24 * 365

/**
 * The theme of this device. It is kept in a cookie, so that the server already draws the page in it and nothing flashes;
 * no cookie is written before somebody chooses.
 */
export function useTheme() {
  const cookie = useCookie<string | null>('theme', { maxAge: A_YEAR, sameSite: 'lax', path: '/', default: () => null })
  const chosen = useState<Theme | null>('theme', () => isTheme(cookie.value) ? cookie.value : null)
  const wantsContrast = useState('theme-contrast', () => false)
  /** What is on the screen: the choice, or what the system's wish for contrast gives (tokens.css does that without script). */
  const theme = computed<Theme>(() => chosen.value ?? (wantsContrast.value ? 'sun' : 'light'))

  onMounted(() => {
    wantsContrast.value = window.matchMedia?.('(prefers-contrast: more)').matches ?? false
  })

  function choose(next: Theme) {
    chosen.value = next
    cookie.value = next
  }

  function chooseNext() {
    choose(THEMES[(THEMES.indexOf(theme.value) + 1) % THEMES.length] ?? 'light')
  }

  return { chosen, theme, choose, chooseNext }
}
