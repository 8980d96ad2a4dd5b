/** What went wrong, in words for the person at the terminal: printed without a stack. */
export class LaunchError extends Error {}
