/** One line of the list of keys. */
export interface KeyLine {
  readonly keys: string;
  readonly does: string;
}

/** Every key of the window, as its own help lists them. */
export const KEY_LINES: readonly KeyLine[] = [
  { keys: 'Alt+1, Alt+2, …', does: 'go to the station of that number' },
  { keys: 'F6, Shift+F6', does: 'walk round the stations' },
  { keys: 'Ctrl+Z', does: 'undo the last edit' },
  { keys: 'Ctrl+Y or Ctrl+Shift+Z', does: 'redo it' },
  { keys: 'F1', does: 'show these keys' },
  { keys: 'Enter', does: 'in a field: take what was typed' },
  { keys: 'Esc', does: 'in a field: put the old text back' },
  { keys: 'Up, Down', does: 'in a field: step the last digit; with Shift by ten' },
  { keys: 'Up, Down', does: 'in the materials and the line-up: walk' },
  { keys: 'Left, Right', does: 'in the front: walk along a line' },
  { keys: 'Up, Down', does: 'in the front: change the line' },
  { keys: 'Space', does: 'in the front: try the tube' },
  { keys: 'Enter', does: 'in the front: hold the tube, and make it the pick' },
  { keys: 'arrow keys', does: 'in the wall map: try a tube; with Shift ten steps on' },
  { keys: 'Enter', does: 'in the wall map: hold the tube on trial' },
  { keys: 'Esc', does: 'in the front, the wall map and the pick: let the tube on trial go' },
  { keys: 'Space', does: 'in the materials: tick' },
  { keys: 'Enter', does: 'in the line-up: make it the pick' },
  { keys: 'Ctrl+C', does: 'in the line-up: copy the row' },
];
