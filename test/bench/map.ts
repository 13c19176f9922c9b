import { mapAxes } from '../../src/figure/mapAxes.js';
import { MapSheet } from '../../src/figure/mapSheet.js';
import { wallMapFigure } from '../../src/figure/wallMap.js';
import { sizeMaterial } from '../../src/sizing/candidate.js';
import { designMap } from '../../src/sizing/map.js';
import { mapPoints } from '../../src/sizing/mapPoints.js';
import { FOUR_CASES } from './jobs.js';
import { atMost, shown, table } from './table.js';
import { medianTime } from './time.js';

/** What a map may take, ms. */
const TRACE_TARGET = 30;
/** What drawing it anew on a sheet of another size may take, ms. */
const DRAW_TARGET = 100;

/** A row for each job: the map traced with the solves that it needs, and drawn. */
export function maps(): string {
  const rows = FOUR_CASES.map(({ name, job, metal }) => {
    const candidate = sizeMaterial({ job, units: {} }, metal);
    const trace = () => {
      const points = mapPoints(job, metal, candidate);
      const axes = mapAxes(points, job.tube, [], 'SI', false);
      return { points, axes, map: designMap(job, metal, axes.window) };
    };
    const { points, axes, map } = trace();
    const content = { map, points, metal: { metal, length: job.tube.length }, held: [], isPick: true, notes: [] };
    const draw = () => wallMapFigure(content, new MapSheet(axes, 720, 320), 'SI');
    const [traced, drawn] = [medianTime(40, trace), medianTime(40, draw)];
    return [name, shown(traced), atMost(traced, TRACE_TARGET), shown(drawn), atMost(drawn, DRAW_TARGET)];
  });
  return table('Wall maps', [['job', 'traced, ms', 'target', 'drawn, ms', 'target'], ...rows]);
}
