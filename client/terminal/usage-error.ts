/** A call or an input that cannot be used: exit status 2, the message on standard error. */
export class UsageError extends Error {}
