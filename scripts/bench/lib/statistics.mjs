export const mean = values => values.reduce((sum, value) => sum + value, 0) / values.length

/** The value below which the share `at` (0 to 1) of the values lies, between neighbours by straight line. */
export function quantile(values, at) {
  const sorted = [...values].sort((a, b) => a - b)
  const place = (sorted.length - 1) * at
  const below = Math.floor(place)
  return sorted[below] + (sorted[Math.ceil(place)] - sorted[below]) * (place - below)
}

export const median = values => quantile(values, 0.5)

/** How far the middle half of the values spreads, as a share of their median: above 0.25 a run is too noisy to keep. */
export const spread = values => (quantile(values, 0.75) - quantile(values, 0.25)) / median(values)

/** Values in so many groups of neighbours. */
export function inGroups(values, groups) {
  const size = Math.floor(values.length / groups)
  return Array.from({ length: groups }, (_, at) => values.slice(at * size, (at + 1) * size))
}
