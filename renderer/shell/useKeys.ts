import { onMounted, onUnmounted } from 'vue';
import { useJob } from '../stores/job.js';

function stations(): readonly HTMLElement[] {
  return Array.from(document.querySelectorAll<HTMLElement>('[data-station]'));
}

function walk(direction: 1 | -1): void {
  const all = stations();
  const here = all.findIndex((station) => station.contains(document.activeElement));
  const next = here === -1 ? (direction === 1 ? 0 : all.length - 1) : here + direction;
  all.at(next % all.length)?.focus();
}

function goTo(number: string): boolean {
  const station = stations().find(({ dataset }) => dataset['station'] === number);
  station?.focus();
  return station !== undefined;
}

/** Moves the keyboard between stations: true where the key was one of these. */
function moves({ key, code, altKey, shiftKey, ctrlKey, metaKey }: KeyboardEvent): boolean {
  if (key === 'F6') {
    walk(shiftKey ? -1 : 1);
    return true;
  }
  return altKey && !ctrlKey && !metaKey && code.startsWith('Digit') && goTo(code.slice('Digit'.length));
}

/** The keys that hold in the whole window: undo and redo, and the way between stations. */
export function useKeys(): void {
  const job = useJob();

  /** Undo or redo: true where the key was one of these. */
  function travels({ key, shiftKey, altKey, ctrlKey, metaKey }: KeyboardEvent): boolean {
    if (altKey || !(ctrlKey || metaKey)) return false;
    const letter = key.toLowerCase();
    if (letter === 'z' && !shiftKey) job.undo();
    else if (letter === 'y' || letter === 'z') job.redo();
    else return false;
    return true;
  }

  const listen = (event: KeyboardEvent): void => {
    if (!event.defaultPrevented && (travels(event) || moves(event))) event.preventDefault();
  };
  onMounted(() => {
    window.addEventListener('keydown', listen);
  });
  onUnmounted(() => {
    window.removeEventListener('keydown', listen);
  });
}
