/** Where to go after signing in: only to addresses of our own, else to the bench. */
export function ownAddress(to: string | undefined): string {
  return to !== undefined && /^\/(?![/\\])/.test(to) ? to : '/';
}
