import type { FirmContext } from '../services/firm-context'

declare module 'h3' {
  interface H3EventContext {
    /** Who is signed in; undefined until asked. */
    firm?: FirmContext | null
  }
}
