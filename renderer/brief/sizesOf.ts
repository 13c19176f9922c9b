import { isObject } from '../job/keyPath.js';

/** Which sizes the job takes, as its document says it: any, a shipped list by id, or rows of its own. */
export type SizesChoice =
  | { readonly kind: 'any' }
  | { readonly kind: 'list'; readonly id: string }
  | { readonly kind: 'own'; readonly count: number };

/** Reads the choice of sizes in a document, as far as it makes sense. */
export function sizesOf(value: unknown): SizesChoice {
  const stock = isObject(value) ? value['stock'] : undefined;
  if (typeof stock === 'string') return { kind: 'list', id: stock };
  return Array.isArray(stock) ? { kind: 'own', count: stock.length } : { kind: 'any' };
}
