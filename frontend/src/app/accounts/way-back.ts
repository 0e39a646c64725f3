/** Where to go after signing in: only a path of our own, never another site however it is dressed up. */
export const wayBack = (next: string | undefined): string => (next && /^\/(?![/\\])[^\\\s]*$/.test(next) ? next : '/');
