/** Reads a form body with nested names, `line_items[0][price_data][currency]=gbp`, into objects. @returns {Record<string, any>} */
export function parseForm(body) {
  const tree = {}
  for (const [name, value] of new URLSearchParams(body)) {
    const path = name.split(/[[\]]+/).filter(Boolean)
    if (path.some(part => part === '__proto__' || part === 'constructor')) continue
    const last = path.pop()
    let place = tree
    for (const part of path) place = place[part] ??= {}
    place[last] = value
  }
  return tree
}

/** The sum of a checkout's lines in the currency's small unit. */
export function totalOf(lineItems = {}) {
  return Object.values(lineItems).reduce((sum, { quantity = '1', price_data: price }) => sum + Number(quantity) * Number(price?.unit_amount ?? Number.NaN), 0)
}
