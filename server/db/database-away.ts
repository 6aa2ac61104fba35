const AWAY = new Set(['ECONNREFUSED', 'ECONNRESET', '57P01', '57P02', '57P03', '53300'])

/** Whether an error says that the database cannot be reached just now, however it was wrapped on the way. */
export function isDatabaseAway(error: unknown): boolean {
  const { code, message, cause } = error as { code?: string, message?: string, cause?: unknown }
  return (code !== undefined && AWAY.has(code)) || /timeout exceeded when trying to connect|Connection terminated/.test(message ?? '') || (cause !== undefined && isDatabaseAway(cause))
}
