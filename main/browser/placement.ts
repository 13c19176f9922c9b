import { readFileSync } from 'node:fs';
import path from 'node:path';

/** Where a browser's window stood when it was closed, px. */
export interface Placed {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
  readonly maximized: boolean;
}

type Entries = ReadonlyMap<string, unknown>;

/** A window of less is a mistake of the record, px. */
const LEAST = 200;
/** A window's name, split at its dots, is as deep as this at most. */
const DEEPEST = 8;

function entriesOf(value: unknown): Entries {
  return new Map<string, unknown>(typeof value === 'object' && value !== null ? Object.entries(value) : []);
}

function numberOf(entries: Entries, key: string): number {
  const value = entries.get(key);
  return typeof value === 'number' && Number.isInteger(value) ? value : NaN;
}

function placedIn(entries: Entries): Placed | null {
  const [left, top] = [numberOf(entries, 'left'), numberOf(entries, 'top')];
  const width = numberOf(entries, 'right') - left;
  const height = numberOf(entries, 'bottom') - top;
  return width >= LEAST && height >= LEAST
    ? { left, top, width, height, maximized: entries.get('maximized') === true }
    : null;
}

function search(value: unknown, depth: number): Placed | null {
  const entries = entriesOf(value);
  const placed = placedIn(entries);
  if (placed !== null || depth === 0) return placed;
  return [...entries.values()].map((own) => search(own, depth - 1)).find((own) => own !== null) ?? null;
}

/**
 * Where the window of a profile stood, by the browser's own record, or null. The browser itself writes the record under
 * the window's name, and where that name is an address with dots in it finds it never again.
 */
export function placementIn(profile: string): Placed | null {
  try {
    const preferences: unknown = JSON.parse(readFileSync(path.join(profile, 'Default', 'Preferences'), 'utf8'));
    return search(entriesOf(entriesOf(preferences).get('browser')).get('app_window_placement'), DEEPEST);
  } catch {
    return null;
  }
}
