/** True while the session has run out over an untouched page: the page stays, a sign-in opens over it. */
export const useSignInAgain = () => useState('sign-in-again', () => false)
