/** True when PostgreSQL refused to remove a row that others point to. Source: PostgreSQL manual, appendix A: 23503, or 23001 for RESTRICT. */
export function isForeignKeyViolation(thrown: unknown): boolean {
  const error = thrown instanceof Error && thrown.cause ? thrown.cause : thrown
  return typeof error === 'object' && error !== null && 'code' in error && (error.code === '23503' || error.code === '23001')
}
