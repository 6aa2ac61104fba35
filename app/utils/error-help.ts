/** The sentences of the page shown in place of one that cannot be. `again` says whether trying again may help. */
export interface ErrorHelp { title: string, happened: string, next: string, again: boolean }

const NOT_THERE: ErrorHelp = {
  title: 'There is no page at this address',
  happened: 'The address may be mistyped or cut short, or what it named belongs to another firm or was withdrawn.',
  next: 'If the address came in an e-mail, open the link again or ask the sender for a fresh one.',
  again: false,
}
const NOT_YOURS: ErrorHelp = {
  title: 'Your role does not open this page',
  happened: 'Nothing is broken: this page is for people with another role in your firm.',
  next: 'The principal of your firm can give you that role under People.',
  again: false,
}
const SIGN_IN: ErrorHelp = {
  title: 'Sign in to see this page',
  happened: 'You have been signed out, or have not signed in on this device yet.',
  next: 'What you keyed before is still kept on this device. Sign in and come back to it.',
  again: false,
}
const BUSY: ErrorHelp = {
  title: 'Copperplate is not ready to answer',
  happened: 'The server is starting, busy or being worked on.',
  next: 'What you keyed is kept on this device and goes on its way by itself. Try again in a minute.',
  again: true,
}
const BROKEN: ErrorHelp = {
  title: 'Something went wrong',
  happened: 'The page could not be put together. The fault is ours and has been written down.',
  next: 'What you kept before is still there. Try again; if it happens twice, tell your office what you were doing and the time.',
  again: true,
}

/** The sentences for an HTTP status. */
export function helpFor(status: number): ErrorHelp {
  if (status === 404 || status === 410) return NOT_THERE
  if (status === 403) return NOT_YOURS
  if (status === 401) return SIGN_IN
  if (status === 503 || status === 429) return BUSY
  return BROKEN
}
