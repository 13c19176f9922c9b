import { joinPath } from '../material/problem.js';
import { refuseValue, type Reading } from '../material/reading.js';

/**
 * Notes every name of a list that stood there before. Empty names are passed over: they failed already.
 * @param path key path of the list
 * @param key the key that must be unique, such as "name"; empty where the entries themselves are the names
 */
export function refuseRepeats(names: readonly string[], path: string, key: string, reading: Reading): void {
  const seen = new Set<string>();
  names.forEach((name, index) => {
    const own = key === '' ? joinPath(path, index) : joinPath(joinPath(path, index), key);
    if (name !== '' && seen.has(name)) refuseValue(reading, own, name, 'stands in the list twice', 'every name once');
    seen.add(name);
  });
}
