import { CANCEL_WORDS, EARLY_WORDS } from './quote-words.data'

/** The terms a quote starts from; the office may change them before it is sent. One paragraph a line. */
export function defaultTerms(firmName: string): string {
  return [
    `The price covers the work listed. If something hidden comes to light, ${firmName} stops, says what it costs, and goes on only when you have agreed in writing.`,
    'The work waits until the electricity network operator has allowed it, where its permission is needed first.',
    'The deposit is part of the price. The rest is due when the work is finished, tested and handed over.',
    CANCEL_WORDS,
    EARLY_WORDS,
  ].join('\n')
}
