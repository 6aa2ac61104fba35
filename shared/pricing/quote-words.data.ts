/** The two sentences of consumer law that every quote to a home carries (rules COM-01 and COM-02). */
export const CANCEL_WORDS = 'You may cancel within 14 days, without a reason, by any clear message to us. The 14 days begin the day after you accept, or, for goods, the day after you receive them.'
export const EARLY_WORDS = 'Work inside those 14 days begins only at your express request. If you then cancel, you pay for what was done until then; once all of it is done at your request, the right to cancel the work has ended.'
