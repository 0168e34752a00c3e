/** A path of this site to go to after signing in; `/` for anything that could lead elsewhere. */
export function safePath(target: string | undefined): string {
  if (!target || !/^\/(?![/\\])[^\\\s]*$/.test(target)) return '/';
  return target.startsWith('/sign-in') ? '/' : target;
}
