/** A job file as entered: JSON, its values as the user wrote them. Never changed in place. */
export type JobDocument = Readonly<Record<string, unknown>>;

/** One edit: the key path and the new value; undefined takes the key out. */
export interface Edit {
  readonly path: string;
  readonly value: unknown;
}

/** Whether a JSON value is an object, neither null nor a list. */
export function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A JSON value as a document; an empty one where it is no object. */
export function documentOf(value: unknown): JobDocument {
  return isObject(value) ? value : {};
}

function keysOf(path: string): readonly string[] {
  return path === '' ? [] : path.split('.');
}

/** What stands at a key path such as "loads.0.torque"; undefined where nothing does. */
export function valueAt(document: unknown, path: string): unknown {
  let value = document;
  for (const key of keysOf(path)) {
    if (Array.isArray(value)) value = (value as readonly unknown[])[Number(key)];
    else value = isObject(value) && Object.hasOwn(value, key) ? value[key] : undefined;
  }
  return value;
}

function withEntry(list: readonly unknown[], index: number, value: unknown): readonly unknown[] {
  return value === undefined ? list.filter((_, at) => at !== index) : list.with(index, value);
}

/** The object without one of its keys. */
export function without(source: JobDocument, key: string): JobDocument {
  return Object.fromEntries(Object.entries(source).filter(([own]) => own !== key));
}

function withKey(source: Readonly<Record<string, unknown>>, key: string, value: unknown): unknown {
  return value === undefined ? without(source, key) : { ...source, [key]: value };
}

function put(source: unknown, keys: readonly string[], value: unknown): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return value;
  if (Array.isArray(source)) {
    const list: readonly unknown[] = source;
    const index = Number(key);
    if (index >= list.length) return [...list, put(undefined, rest, value)];
    return withEntry(list, index, put(list[index], rest, value));
  }
  const object = isObject(source) ? source : {};
  if (value === undefined && !Object.hasOwn(object, key)) return object;
  const inner = put(object[key], rest, value);
  return withKey(object, key, inner);
}

/**
 * The document with one value changed; what is not on the way is shared with the old one. Objects on the way that are
 * not there yet are made; undefined takes a key, or an entry of a list, out.
 */
export function withValue(document: JobDocument, { path, value }: Edit): JobDocument {
  const next = put(document, keysOf(path), value);
  return isObject(next) ? next : document;
}

/** Whether two JSON values say the same, whatever the order of keys. */
export function sameValue(one: unknown, other: unknown): boolean {
  if (one === other) return true;
  if (Array.isArray(one) && Array.isArray(other))
    return one.length === other.length && one.every((value, index) => sameValue(value, other[index]));
  if (!isObject(one) || !isObject(other)) return false;
  const keys = Object.keys(one);
  return (
    keys.length === Object.keys(other).length &&
    keys.every((key) => Object.hasOwn(other, key) && sameValue(one[key], other[key]))
  );
}
