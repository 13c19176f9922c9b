import { execFileSync } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** A browser's program and what its process needs in its environment. */
export interface BrowserProgram {
  readonly file: string;
  readonly env: Readonly<Record<string, string>>;
}

/**
 * Unpacks the browser that comes as a package. It goes wherever TMPDIR points; told that it is on a bare machine, it
 * brings the libraries along that a desktop would have.
 */
const UNPACK = `import chromium from '@sparticuz/chromium'; await chromium.executablePath();`;
const BARE = { AWS_EXECUTION_ENV: 'AWS_Lambda_nodejs20.x' };

function versionOf(root: string): string {
  const manifest = readFileSync(path.join(root, 'node_modules', '@sparticuz', 'chromium', 'package.json'), 'utf8');
  return (JSON.parse(manifest) as { readonly version: string }).version;
}

/** The package's own list of fonts names folders that only its usual machine has; this one names the fonts it brings. */
function fontList(folder: string): string {
  return `<?xml version="1.0"?>
<!DOCTYPE fontconfig SYSTEM "fonts.dtd">
<fontconfig>
  <dir>${folder}/fonts/fonts</dir>
  <cachedir>${folder}/fonts/cache</cachedir>
</fontconfig>
`;
}

function unpack(root: string, folder: string): void {
  mkdirSync(path.dirname(folder), { recursive: true });
  const aside = mkdtempSync(`${folder}-`);
  const env = { ...process.env, ...BARE, TMPDIR: aside };
  execFileSync(process.execPath, ['--input-type=module', '-e', UNPACK], { cwd: root, env });
  writeFileSync(path.join(aside, 'fonts', 'fonts.conf'), fontList(folder));
  // whole or not at all, whoever else unpacks it at the same time
  try {
    renameSync(aside, folder);
  } catch (error) {
    rmSync(aside, { recursive: true });
    if (!existsSync(folder)) throw error;
  }
}

/** The browser that comes as a package, for a machine that has none; unpacked into the cache at the first use. */
export function shippedBrowser(root: string): BrowserProgram {
  const folder = path.join(root, '.cache', `chromium-${versionOf(root)}`);
  if (!existsSync(folder)) unpack(root, folder);
  return {
    file: path.join(folder, 'chromium'),
    env: { LD_LIBRARY_PATH: path.join(folder, 'al2023', 'lib'), FONTCONFIG_PATH: path.join(folder, 'fonts') },
  };
}
