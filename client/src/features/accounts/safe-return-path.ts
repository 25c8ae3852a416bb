/** Where to go after signing in: only a path of our own, never another site. */
export function safeReturnPath(to: string | null): string {
  return to !== null && /^\/(?![/\\])/.test(to) && !to.startsWith('/sign-in') ? to : '/'
}
