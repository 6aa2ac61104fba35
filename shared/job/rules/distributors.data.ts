/** The first two digits of a supply number's core: region and present network operator (rule SUR-03). */
export interface Distributor {
  id: string
  region: string
  operator: string
}

/** Ids from this one on belong to independent network operators, whose region the number does not tell (rule SUR-04). */
export const FIRST_INDEPENDENT_ID = 24

/** Of the operator of 16 the present name and owner could not be verified. */
export const DISTRIBUTORS: readonly Distributor[] = [
  { id: '10', region: 'Eastern England', operator: 'UK Power Networks (Eastern)' },
  { id: '11', region: 'East Midlands', operator: 'National Grid Electricity Distribution' },
  { id: '12', region: 'London', operator: 'UK Power Networks (London)' },
  { id: '13', region: 'Merseyside, Cheshire and North Wales', operator: 'SP Energy Networks (SP Manweb)' },
  { id: '14', region: 'West Midlands', operator: 'National Grid Electricity Distribution' },
  { id: '15', region: 'North East England', operator: 'Northern Powergrid (Northeast)' },
  { id: '16', region: 'North West England', operator: 'Electricity North West' },
  { id: '17', region: 'North Scotland', operator: 'Scottish and Southern Electricity Networks (SHEPD)' },
  { id: '18', region: 'South and Central Scotland', operator: 'SP Energy Networks (SP Distribution)' },
  { id: '19', region: 'South East England', operator: 'UK Power Networks (South Eastern)' },
  { id: '20', region: 'Southern England', operator: 'Scottish and Southern Electricity Networks (SEPD)' },
  { id: '21', region: 'South Wales', operator: 'National Grid Electricity Distribution' },
  { id: '22', region: 'South West England', operator: 'National Grid Electricity Distribution' },
  { id: '23', region: 'Yorkshire', operator: 'Northern Powergrid (Yorkshire)' },
]

/** Northern Ireland has one operator and another kind of number (rule SUR-05). */
export const NORTHERN_IRELAND_OPERATOR = 'NIE Networks'
