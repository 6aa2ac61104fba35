declare module '#auth-utils' {
  interface SecureSessionData {
    /** The secret of the server's session row; nothing else is sealed in the cookie. */
    sid: string
  }
}

export {}
