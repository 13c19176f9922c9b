import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

/** The tree's own imports: each file, with the files of the tree that it imports. Paths from the root, with slashes. */
export type Imports = ReadonlyMap<string, readonly string[]>;

const SOURCE = /\.(?:ts|js|vue)$/;
const OUTSIDE = new Set(['node_modules', 'dist', 'out', 'coverage', '.git']);

/** Every source file under a folder, its tooling included. */
function sources(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    if (OUTSIDE.has(entry.name)) return [];
    const full = path.join(folder, entry.name);
    if (entry.isDirectory()) return sources(full);
    return SOURCE.test(entry.name) ? [full] : [];
  });
}

/** The file that an import names: `.js` stands for the `.ts` beside it, as TypeScript has it. */
function resolve(file: string, specifier: string): string | null {
  const named = path.resolve(path.dirname(file), specifier);
  const candidates = [named.replace(/\.js$/, '.ts'), named, `${named}.ts`, path.join(named, 'index.ts')];
  return candidates.find((candidate) => SOURCE.test(candidate) && existsSync(candidate)) ?? null;
}

/** What one file imports by a relative path, whether for its values or for its types alone. */
function importsOf(file: string): string[] {
  const text = readFileSync(file, 'utf8');
  const { importedFiles } = ts.preProcessFile(text, true, true);
  return importedFiles
    .filter(({ fileName }) => fileName.startsWith('.'))
    .map(({ fileName }) => resolve(file, fileName))
    .filter((target) => target !== null);
}

/** Reads the imports of every source file under `root`. */
export function readImports(root: string): Imports {
  const short = (file: string): string => path.relative(root, file).split(path.sep).join('/');
  return new Map(sources(path.resolve(root)).map((file) => [short(file), importsOf(file).map(short)]));
}

/** A circle of imports, its first file named again at its end; null where there is none. */
export function findCircle(imports: Imports): readonly string[] | null {
  const done = new Set<string>();
  const walk = (file: string, trail: readonly string[]): readonly string[] | null => {
    if (trail.includes(file)) return [...trail.slice(trail.indexOf(file)), file];
    if (done.has(file)) return null;
    for (const target of imports.get(file) ?? []) {
      const circle = walk(target, [...trail, file]);
      if (circle !== null) return circle;
    }
    done.add(file);
    return null;
  };
  for (const file of imports.keys()) {
    const circle = walk(file, []);
    if (circle !== null) return circle;
  }
  return null;
}
