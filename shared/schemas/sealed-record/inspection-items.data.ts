/**
 * What is looked at before a new charging circuit is energised, in our own words.
 * The numbers follow the shortened list in use since amendment 2; the item names are from memory, and what amendment 4
 * changed in the list has not been read, so the list carries its own edition and is replaced as data.
 */
export const inspectionItems = {
  edition: 'Amendment 2 list',
  source: 'Order of the shortened schedule of inspections, BS 7671 Appendix 6',
  confidence: 'from memory',
  items: [
    { number: '1', words: 'Condition of the intake equipment (looked at only)' },
    { number: '2', words: 'Parallel or alternative sources of supply' },
    { number: '3', words: 'Automatic disconnection of supply: earthing, bonding, protective conductors and devices' },
    { number: '4', words: 'Basic protection' },
    { number: '5', words: 'Protective measures other than automatic disconnection' },
    { number: '6', words: 'Additional protection: 30 mA residual-current device, supplementary bonding' },
    { number: '7', words: 'Distribution equipment' },
    { number: '8', words: 'Distribution and final circuits' },
    { number: '9', words: 'Isolation and switching' },
    { number: '10', words: 'Fixed current-using equipment' },
    { number: '11', words: 'Identification and notices' },
    { number: '12', words: 'Rooms with a bath or shower' },
    { number: '13', words: 'Other special installations: vehicle charging (section 722)' },
    { number: '13.1', words: 'Earthing method suits the supply and the place of charging' },
    { number: '13.2', words: 'Circuit serves the charging point alone' },
    { number: '13.3', words: 'Residual-current protection of its own, with detection of smooth d.c. fault current' },
    { number: '13.4', words: 'Kind of socket or connector, and its height' },
    { number: '13.5', words: 'Enclosure and protection against impact' },
    { number: '13.6', words: 'Isolation of the charging point' },
    { number: '13.7', words: 'Open-PEN function fitted and set' },
    { number: '13.8', words: 'Load limiter fitted and set' },
    { number: '14', words: 'Installations that also generate or store' },
  ],
} as const
