import { defineComponent } from 'vue';
import { expect, it } from 'vitest';
import { inOneColumn, stationsWith } from '../../../renderer/shell/stations.js';

const map = defineComponent({});
const numbers = (stations: ReturnType<typeof stationsWith>): readonly string[] =>
  stations.map(({ area, number }) => `${String(number)} ${area}`);

it('stations count on from the brief, with or without a wall map', () => {
  expect(numbers(stationsWith(null))).toEqual(['2 front', '3 pick', '4 lineup']);
  expect(numbers(stationsWith(map))).toEqual(['2 front', '3 map', '4 pick', '5 lineup']);
});

it('in one column the answer comes first, and keeps its number', () => {
  expect(numbers(inOneColumn(stationsWith(map)))).toEqual(['4 pick', '2 front', '3 map', '5 lineup']);
});
