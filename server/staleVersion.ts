import { DomainError } from '#shared/errors.ts'

/** Someone else changed the same thing meanwhile. Both states reach the person: theirs in the details, one's own is still in the form. */
export const staleVersion = (theirs: unknown) => new DomainError(
  'version.stale', 'Someone changed this while you were editing. Nothing of yours is lost: compare the two and save again.', { theirs },
)
