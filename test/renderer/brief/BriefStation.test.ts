// @vitest-environment happy-dom
import { mount, type VueWrapper } from '@vue/test-utils';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import BriefStation from '../../../renderer/brief/BriefStation.vue';
import type { useJob } from '../../../renderer/stores/job.js';
import { begin, DEMOS, smallJob } from '../window.js';

let job: ReturnType<typeof useJob>;
let brief: VueWrapper;

function show(first = smallJob(), narrow = false): void {
  job = begin(first);
  brief = mount(BriefStation, { props: { narrow }, attachTo: document.body });
}

beforeEach(() => {
  show();
});
afterEach(() => {
  brief.unmount();
});

const labelled = (label: string) => brief.get<HTMLInputElement>(`[aria-label="${label}"]`);
const button = (text: string) => {
  const found = brief.findAll('button').find((one) => one.text() === text);
  if (found === undefined) throw new Error(`There is no key "${text}".`);
  return found;
};
const says = (): string => brief.text().replace(/\s+/g, ' ');

describe('the brief', () => {
  it('has a field for every value of the job, with its defaults in sight', () => {
    const quantities = ['torque', 'bending', 'axial', 'twist at most', 'shear at most'];
    const factors = ['yield factor', 'ultimate factor', 'buckling factor'];
    for (const row of [...quantities, ...factors]) expect(labelled(`${row}, jam`).element.type).toBe('text');
    expect(labelled('bending, jam').element.placeholder).toBe('none');
    expect(labelled('buckling factor, jam').element.placeholder).toBe('1.5');
    expect(labelled('between bearings').element.placeholder).toBe('1.4 m');
    expect(labelled('outer diameter at most').element.value).toBe('90 mm');
    expect(labelled('torsion buckling knock-down').element.placeholder).toBe('0.67');
  });

  it('lets the buckling factor follow the ultimate factor of its case', async () => {
    await labelled('ultimate factor, jam').setValue('2');
    expect(labelled('buckling factor, jam').element.placeholder).toBe('2');
  });

  it('tells a mistake below its row, and points to it', async () => {
    await labelled('torque, jam').setValue('900 mm');
    await labelled('torque, jam').trigger('blur');
    const said = brief.get(`#${labelled('torque, jam').attributes('aria-describedby') ?? ''}`);
    expect(said.text()).toBe('“900 mm” is a length; expected a torque such as “900 N·m”.');
  });

  it('tells mistakes that no field has', () => {
    brief.unmount();
    show(smallJob({ colour: 'red' }));
    expect(says()).toContain('colour: "colour" is not a key of a job');
  });

  it('adds, copies and removes load cases, each as one edit', async () => {
    await button('add a case').trigger('click');
    expect(job.at('loads.1')).toEqual({ name: 'case 2', torque: '0 N·m' });
    expect(document.activeElement).toBe(labelled('torque, case 2').element);
    await labelled('copy jam').trigger('click');
    expect(job.at('loads.1.name')).toBe('jam copy');
    await labelled('remove jam').trigger('click');
    expect(job.at('loads.0.name')).toBe('jam copy');
    for (let step = 0; step < 3; step += 1) job.undo();
    expect(job.document).toEqual(smallJob());
  });

  it('keeps the last case', () => {
    expect(brief.find('[aria-label="remove jam"]').exists()).toBe(false);
  });

  it('says of a torque’s hand: not said, both, one', async () => {
    const hand = brief.get('[role="checkbox"]');
    const states = [];
    for (let press = 0; press < 4; press += 1) {
      states.push([hand.attributes('aria-checked'), job.at('loads.0.reversing')]);
      await hand.trigger('click');
    }
    expect(states).toEqual([
      ['mixed', undefined],
      ['true', true],
      ['false', false],
      ['mixed', undefined],
    ]);
  });

  it('takes the speed out with its margin', async () => {
    expect(labelled('margin to first whirl').element.disabled).toBe(true);
    await labelled('fastest running speed').setValue('3000 rpm');
    await labelled('margin to first whirl').setValue('1.4');
    expect(job.at('speed')).toEqual({ max: '3000 rpm', margin: 1.4 });
    await labelled('fastest running speed').setValue('');
    await labelled('fastest running speed').trigger('blur');
    expect(job.document).not.toHaveProperty('speed');
  });
});

describe('made from', () => {
  const tick = (id: string) => brief.get<HTMLInputElement>(`[data-material="${id}"]`);

  it('unticks a material, and the pick with it, and brings it back as it was', async () => {
    job.editAll([
      { path: 'pick', value: { material: 'al-2024-t3' } },
      { path: 'materials.1', value: { ...job.records.get('al-2024-t3'), pricePerKilogram: 9 } },
    ]);
    await brief.vm.$nextTick();
    await tick('al-2024-t3').trigger('change');
    expect(job.at('materials')).toEqual(['al-6061-t6', 'steel-4130-n']);
    expect(job.document).not.toHaveProperty('pick');
    expect(job.sound).toBe(true);
    await tick('al-2024-t3').trigger('change');
    expect(job.at('materials.0.pricePerKilogram')).toBe(9);
  });

  it('prices a material of the library with a record of its own', async () => {
    await labelled('price of Aluminium 6061-T6, drawn tube').setValue('6.5');
    expect(job.at('materials.0')).toEqual({ ...job.records.get('al-6061-t6'), pricePerKilogram: 6.5 });
    expect(job.lastSound?.brief.job.materials[0]?.pricePerKilogram).toBe(6.5);
    await labelled('price of Aluminium 6061-T6, drawn tube').setValue('');
    await labelled('price of Aluminium 6061-T6, drawn tube').trigger('blur');
    expect(job.at('materials.0')).toBe('al-6061-t6');
  });

  it('tells a wrong price below its material', async () => {
    await labelled('price of Aluminium 6061-T6, drawn tube').setValue('dear');
    await labelled('price of Aluminium 6061-T6, drawn tube').trigger('blur');
    expect(says()).toContain('“dear” is not a number');
  });

  it('shows the whole library on demand, and walks it with the arrow keys', async () => {
    await button(`show ${job.library.size - 3} more of the library`).trigger('click');
    const ticks = brief.findAll<HTMLInputElement>('[data-material]');
    expect(ticks).toHaveLength(job.library.size);
    expect(ticks.filter(({ element }) => element.tabIndex === 0)).toHaveLength(1);
    await ticks[0]?.trigger('keydown', { key: 'ArrowDown' });
    expect(document.activeElement).toBe(ticks[1]?.element);
    await ticks[1]?.trigger('keydown', { key: 'ArrowUp' });
    expect(document.activeElement).toBe(ticks[0]?.element);
  });

  it('says that something must be ticked', async () => {
    for (const id of ['al-6061-t6', 'al-2024-t3', 'steel-4130-n']) await tick(id).trigger('change');
    expect(job.sound).toBe(false);
    expect(says()).toContain('expected 1 to 200 materials');
  });
});

describe('sizes', () => {
  it('goes from any size to a list and back', async () => {
    await brief.get('[name="sizes"][value="stock"]').setValue(true);
    expect(job.at('sizes.stock')).toBe('metric-precision');
    expect(says()).toContain(`${job.stockLists.get('metric-precision')?.rows.length ?? 0} sizes`);
    await brief.get('[name="stock-list"][value="inch-gauge"]').setValue(true);
    expect(job.at('sizes.stock')).toBe('inch-gauge');
    await brief.get('[name="sizes"][value="any"]').setValue(true);
    expect(job.at('sizes')).toBe('any');
  });

  it('reads a list of the user’s own, or says what is wrong with it', async () => {
    await brief.get('[name="sizes"][value="stock"]').setValue(true);
    const give = async (text: string): Promise<void> => {
      const input = brief.get<HTMLInputElement>('[type="file"]');
      Object.defineProperty(input.element, 'files', { configurable: true, value: [new File([text], 'mine.csv')] });
      await input.trigger('change');
      await new Promise((resolve) => setTimeout(resolve, 20));
    };
    await give('outer diameter (mm), wall (mm)\n50, thick\n');
    expect(says()).toContain('mine.csv, line 2');
    expect(job.at('sizes.stock')).toBe('metric-precision');
    await give('outer diameter (mm), wall (mm)\n50, 1.5\n60, 2\n');
    expect(job.at('sizes.stock')).toHaveLength(2);
    expect(says()).toContain('mine.csv2 sizes');
    expect(says()).not.toContain('line 2');
  });
});

describe('designs in hand', () => {
  it('stand with their sizes, and can be removed with the pick', async () => {
    brief.unmount();
    show({ ...DEMOS[0], pick: { held: 'tube on the shelf' } });
    expect(labelled('outer diameter, tube on the shelf').element.value).toBe('34.925 mm');
    await labelled('remove tube on the shelf').trigger('click');
    expect(job.at('hold')).toEqual([]);
    expect(job.document).not.toHaveProperty('pick');
    expect(job.sound).toBe(true);
  });
});

describe('in a narrow window', () => {
  it('folds to one line, and unfolds', async () => {
    brief.unmount();
    show(smallJob(), true);
    expect(says()).toContain('900 N·m, 1.4 m, at most 90 mm, 3 materials');
    expect(brief.find('input').exists()).toBe(false);
    await button('edit').trigger('click');
    expect(labelled('torque, jam').element.value).toBe('900 N·m');
  });
});
