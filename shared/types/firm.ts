export type Role = 'office' | 'installer' | 'supervisor' | 'principal'
export type Country = 'England' | 'Wales' | 'Scotland' | 'Northern Ireland'

/** What the principal chooses for the firm. */
export interface FirmSettings {
  /** A one-person firm may countersign its own work; certificate and audit trail then say so. */
  selfCountersign: boolean
  /** Share of the quote asked for on acceptance, in basis points. */
  depositBp: number
  /** Share of VAT, in basis points, on ordinary lines. */
  vatBp: number
  /** How many days a quote stands. */
  quoteDays: number
  schemeMember: boolean
}

/** The signed-in person, as pages see them. */
export interface Me {
  id: string
  name: string
  email: string
  roles: Role[]
  firmId: string
  firmName: string
  selfCountersign: boolean
}
