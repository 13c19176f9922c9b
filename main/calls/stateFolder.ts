import { homedir } from 'node:os';
import path from 'node:path';

/** What the place of the app's own folder depends on. */
export interface Home {
  readonly platform: NodeJS.Platform;
  readonly env: Readonly<Record<string, string | undefined>>;
  readonly home: string;
}

/** The home of this process's user. */
export function thisHome(): Home {
  return { platform: process.platform, env: process.env, home: homedir() };
}

/** A folder that the environment names; the XDG rules have a relative one ignored. */
function named(folder: string | undefined, style: path.PlatformPath): string | null {
  return folder !== undefined && style.isAbsolute(folder) ? folder : null;
}

/** The app's own folder, by the custom of the platform: what it remembers lies there, and nothing else does. */
export function stateFolder({ platform, env, home }: Home): string {
  const style = platform === 'win32' ? path.win32 : path.posix;
  if (platform === 'win32')
    return style.join(named(env['LOCALAPPDATA'], style) ?? style.join(home, 'AppData', 'Local'), 'Wringwall');
  if (platform === 'darwin') return style.join(home, 'Library', 'Application Support', 'Wringwall');
  return style.join(named(env['XDG_STATE_HOME'], style) ?? style.join(home, '.local', 'state'), 'wringwall');
}
