import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { mapAxes } from '../../../src/figure/mapAxes.js';
import { piecesOf } from '../../../src/figure/mapCurves.js';
import { curveName } from '../../../src/figure/mapNames.js';
import { MapSheet } from '../../../src/figure/mapSheet.js';
import { wallMapFigure } from '../../../src/figure/wallMap.js';
import { readJob } from '../../../src/job/read.js';
import { buildLibrary, buildStockLists, rowsById } from '../../../src/material/library.js';
import { sizeMaterial } from '../../../src/sizing/candidate.js';
import { designMap } from '../../../src/sizing/map.js';
import { mapPoints } from '../../../src/sizing/mapPoints.js';
import { shipped } from '../../assets/shipped.js';

const contents = (folder: 'materials' | 'stock'): unknown[] => shipped(folder).map(({ content }) => content);
const stock = rowsById(buildStockLists(contents('stock')));
const library = buildLibrary(contents('materials'), stock);
const folder = fileURLToPath(new URL('../../../assets/jobs/', import.meta.url));

/** Every material of every demo job, with its map. */
const MAPS = readdirSync(folder)
  .sort()
  .flatMap((name) => {
    const read = readJob(JSON.parse(readFileSync(`${folder}${name}`, 'utf8')), library, stock);
    if (!read.ok) throw new Error(`${name} cannot be read`);
    const { brief } = read;
    return brief.job.materials.map((metal) => {
      const candidate = sizeMaterial(brief, metal);
      const points = mapPoints(brief.job, metal, candidate);
      const axes = mapAxes(points, brief.job.tube, [], 'SI', false);
      const sheet = new MapSheet(axes, 718, 321);
      return {
        name: `${name} ${metal.id}`,
        brief,
        metal,
        candidate,
        points,
        sheet,
        map: designMap(brief.job, metal, axes.window),
      };
    });
  });

describe('the demo jobs', () => {
  it('have the cross-hair on the curves of exactly the limits that the report calls full', () => {
    let seen = 0;
    for (const { name, candidate, points, map, sheet } of MAPS) {
      if (points.optimum === null) continue;
      const at = sheet.at(points.optimum);
      const met = map.curves.filter((curve) =>
        piecesOf(curve, sheet).some(({ points: line }) =>
          line.slice(1).some((q, i) => {
            const p = line[i]!;
            const [dx, dy] = [q.x - p.x, q.y - p.y];
            const s = Math.min(
              Math.max(((at.x - p.x) * dx + (at.y - p.y) * dy) / Math.max(dx * dx + dy * dy, 1e-12), 0),
              1,
            );
            return Math.hypot(at.x - p.x - s * dx, at.y - p.y - s * dy) < 0.05;
          }),
        ),
      );
      const full = candidate.limits.filter(({ utilisation }) => utilisation > 1 - 1e-6).map(({ limit }) => limit);
      expect(new Set(met.map(({ limit }) => limit)), name).toEqual(new Set(full));
      seen += full.length;
    }
    expect(seen).toBeGreaterThan(8);
  });

  it('have every curve named that is seen for the length of its name', () => {
    for (const { name, brief, metal, points, map, sheet } of MAPS) {
      const content = {
        map,
        points,
        metal: { metal, length: brief.job.tube.length },
        held: [],
        isPick: true,
        notes: [],
      };
      const texts = wallMapFigure(content, sheet, 'SI').labels.map(({ text }) => text);
      for (const curve of map.curves) {
        const length = Math.max(0, ...piecesOf(curve, sheet).map((piece) => piece.length));
        if (length > 120) expect(texts, name).toContain(curveName(curve, 'SI'));
      }
    }
  });

  it('have a region wherever something fits, and none where nothing does', () => {
    for (const { name, points, map, brief } of MAPS)
      if (brief.job.sizes === 'any') expect(map.region.length > 0, name).toBe(points.optimum !== null);
  });
});
