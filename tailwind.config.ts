import type { Config } from 'tailwindcss'

/** Names only: every value is a custom property of app/assets/css/tokens.css, so that a theme is one attribute on <html>. */
const token = (name: string) => `var(--${name})`
const colours = ['paper', 'chalk', 'ink', 'slate', 'rule', 'linen', 'plum', 'plum-dark', 'plum-tint', 'within', 'within-tint', 'over', 'over-tint', 'brass', 'brass-tint', 'info', 'halo', 'on-fill', 'veil']

export default {
  content: ['./app/**/*.{vue,ts}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      inherit: 'inherit',
      ...Object.fromEntries(colours.map(name => [name, token(name)])),
    },
    fontFamily: { sans: ['Inter', 'system-ui', 'sans-serif'] },
    fontSize: {
      /** These four follow the theme: 13, 20, 26 and 40 px, larger in the sun theme. */
      legal: [token('size-legal'), token('leading-legal')],
      office: ['15px', '22px'],
      tablet: ['17px', '26px'],
      /** Office or tablet or sun size, by the density and theme around it. */
      body: [token('size-body'), token('leading-body')],
      section: [token('size-section'), token('leading-section')],
      page: [token('size-page'), token('leading-page')],
      reading: [token('size-reading'), token('leading-reading')],
      sun: ['56px', '60px'],
    },
    fontWeight: { normal: token('weight-body'), semibold: token('weight-strong'), bold: '700' },
    borderRadius: { none: '0', DEFAULT: '2px' },
    borderColor: { DEFAULT: token('linen'), transparent: 'transparent', current: 'currentColor', ...Object.fromEntries(colours.map(name => [name, token(name)])) },
    borderWidth: { 0: '0', DEFAULT: token('line'), line: token('line'), control: token('line-control'), 1: '1px', 2: '2px', 3: '3px', 8: '8px' },
    boxShadow: { none: 'none', drop: token('drop') },
    screens: { sm: '600px', md: '800px', lg: '1024px', xl: '1280px' },
    extend: {
      minHeight: { target: token('target') },
      height: { target: token('target') },
      minWidth: { target: token('target') },
      maxWidth: { measure: '70ch' },
      spacing: { inset: token('inset') },
      transitionDuration: { DEFAULT: token('quick') },
    },
  },
} satisfies Config
