/** One line of the list of keys. */
export interface KeyLine {
  readonly keys: string;
  readonly does: string;
}

/** Every key of the window, as its own help lists them. */
export const KEY_LINES: readonly KeyLine[] = [
  { keys: 'Alt+1, Alt+2, Alt+3', does: 'go to brief, pick or line-up' },
  { keys: 'F6, Shift+F6', does: 'walk round the stations' },
  { keys: 'Ctrl+Z', does: 'undo the last edit' },
  { keys: 'Ctrl+Y or Ctrl+Shift+Z', does: 'redo it' },
  { keys: 'F1', does: 'show these keys' },
  { keys: 'Enter', does: 'in a field: take what was typed' },
  { keys: 'Esc', does: 'in a field: put the old text back' },
  { keys: 'Up, Down', does: 'in a field: step the last digit; with Shift by ten' },
  { keys: 'Up, Down', does: 'in the materials and the line-up: walk' },
  { keys: 'Space', does: 'in the materials: tick' },
  { keys: 'Enter', does: 'in the line-up: make it the pick' },
  { keys: 'Ctrl+C', does: 'in the line-up: copy the row' },
];
