/** The job that the page's address names. */
export function useJobId(): string {
  return String(useRoute().params.jobId)
}
