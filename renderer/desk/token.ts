const KEY = 'wringwall-token';

/**
 * The token of this start. It comes in the address's fragment, which is then taken out of address bar and history; the
 * tab keeps it, so that a reload finds it.
 */
export function takeToken({ location, history, sessionStorage }: Window): string {
  const given = location.hash.replace(/^#/, '');
  if (given === '') return sessionStorage.getItem(KEY) ?? '';
  history.replaceState(null, '', location.pathname + location.search);
  sessionStorage.setItem(KEY, given);
  return given;
}
