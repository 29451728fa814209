/** Never a real host: whatever leaves it was not a path of ours. */
const ORIGIN = 'http://own.invalid';

/**
 * The path to go to after signing in, as a browser would read what was asked for; nothing when it would lead to another site.
 */
export const ownPath = (wanted: string | null): string | undefined => {
  if (wanted?.startsWith('/') !== true || !URL.canParse(wanted, ORIGIN)) return undefined;
  const { origin, pathname, search } = new URL(wanted, ORIGIN);
  // Dots that fall away can leave two slashes in front, and those begin a host.
  return origin === ORIGIN && !pathname.startsWith('//') ? pathname + search : undefined;
};
