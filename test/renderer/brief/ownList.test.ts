import { expect, it } from 'vitest';
import { readOwnList } from '../../../renderer/brief/ownList.js';

const file = (text: string, size = text.length): Pick<File, 'name' | 'size' | 'text'> => ({
  name: 'mine.csv',
  size,
  text: () => Promise.resolve(text),
});

it('reads a list of the user’s own', async () => {
  const read = await readOwnList(file('outer diameter (mm), wall (mm)\n50, 1.5\n'));
  expect(read).toEqual({ ok: true, entries: [{ outerDiameter: '50 mm', wall: '1.5 mm' }] });
});

it('says what is wrong with a list, the first few mistakes one by one', async () => {
  const rows = Array.from({ length: 9 }, () => '50, wide').join('\n');
  const read = await readOwnList(file(`outer diameter (mm), wall (mm)\n${rows}\n`));
  if (read.ok) throw new Error('the list is wrong');
  expect(read.sentences).toHaveLength(5);
  expect(read.sentences[0]).toMatch(/^mine\.csv, line 2.*wide.*\.$/);
  expect(read.sentences[4]).toBe('And 5 more.');
});

it('does not open a file that is far too large', async () => {
  const read = await readOwnList({ ...file(''), size: 3e6, text: () => Promise.reject(new Error('opened')) });
  expect(read.ok).toBe(false);
});
