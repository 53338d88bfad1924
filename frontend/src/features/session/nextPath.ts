/** Where to go after the sign-in: a path of this application only, never another site. */
export function nextPath(search: URLSearchParams): string {
  const next = search.get('next') ?? '';
  return /^\/(?![/\\])/.test(next) ? next : '/';
}
