/** The grant's share of the cost and its cap a socket, by day of application (rules GRT-01 and GRT-02). */
export interface GrantCap {
  from: string
  until: string
  perSocket_pence: number
}

/** 75 % of the cost with VAT. */
export const GRANT_SHARE = { numerator: 75, denominator: 100 } as const

export const GRANT_CAPS: readonly GrantCap[] = [
  // That the lower cap began on 1 April 2022, when house owners left the scheme, is from memory.
  { from: '2022-04-01', until: '2026-03-31', perSocket_pence: 35_000 },
  { from: '2026-04-01', until: '2027-03-31', perSocket_pence: 50_000 },
]
