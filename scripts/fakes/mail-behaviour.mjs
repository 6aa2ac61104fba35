const MODES = ['accept', 'reject-4xx', 'reject-5xx', 'hang', 'drop-after-data']

/** How the stand-in treats messages; a test scripts it, and `count` runs out by itself. */
export function createBehaviour() {
  let rules = []
  return {
    modes: MODES,
    /** Adds a rule; for one recipient when named, else for all; for `count` messages when given, else until `accept`. @param {{ mode: string, recipient?: string, count?: number }} rule */
    set({ mode, recipient, count }) {
      if (!MODES.includes(mode)) throw new RangeError(`mode is one of ${MODES.join(', ')}`)
      rules = rules.filter(rule => rule.recipient !== recipient)
      if (mode !== 'accept') rules.push({ mode, recipient: recipient?.toLowerCase(), left: count ?? Infinity })
    },
    clear() {
      rules = []
    },
    /** The mode for a message to these addresses; uses up one of its count. */
    take(recipients) {
      const to = recipients.map(address => address.toLowerCase())
      const rule = rules.find(({ recipient }) => recipient && to.includes(recipient)) ?? rules.find(({ recipient }) => !recipient)
      if (!rule) return 'accept'
      rule.left--
      rules = rules.filter(({ left }) => left > 0)
      return rule.mode
    },
    list: () => rules.map(({ mode, recipient, left }) => ({ mode, recipient, left: left === Infinity ? 'no end' : left })),
  }
}
