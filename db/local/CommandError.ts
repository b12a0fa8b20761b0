/** Something about this machine stands in the way; the message is one line that says what happened and what to do. */
export class CommandError extends Error {
  override readonly name = 'CommandError'
}
