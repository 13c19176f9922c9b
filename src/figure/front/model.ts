import type { FrontAxis, Job } from '../../job/job.js';
import type { UnitSystem } from '../../quantity/register.js';
import type { Design, FrontPoint } from '../../report/report.js';
import type { Point } from '../point.js';
import type { AxisKind } from './axis.js';
import type { Band } from './bands.js';
import type { Box } from './box.js';
import type { Curve } from './curve.js';
import type { EndLabel, PickNote } from './labels.js';
import type { Sheet } from './sheet.js';
import type { DrawnTick } from './ticks.js';

/** What a front is drawn from. */
export interface FrontInput {
  readonly job: Job;
  readonly against: FrontAxis;
  readonly points: readonly FrontPoint[];
  /** the chosen design and its material; null where there is none */
  readonly pick: { readonly material: string; readonly design: Design } | null;
  /** what a line is called at its end, by the material's id */
  readonly names: ReadonlyMap<string, string>;
  readonly kind: AxisKind;
  /** fold families into bands */
  readonly folded: boolean;
  readonly system: UnitSystem;
  /** px */
  readonly width: number;
  readonly height: number;
  /** room of the drawing that is not free for labels */
  readonly taken: readonly Box[];
}

/** The job's own limit on the drawing. */
export interface DrawnLimit {
  readonly x: number;
  readonly value: number;
  readonly text: string;
  readonly words: string;
  /** of the words, two lines; null where there is no room */
  readonly box: Box | null;
}

/** A front as a drawing: everything in px, y down, but the axes and the points' values, which are in shown units. */
export interface FrontFigure extends Sheet {
  readonly width: number;
  readonly height: number;
  readonly against: FrontAxis;
  readonly xTicks: readonly DrawnTick[];
  readonly yTicks: readonly DrawnTick[];
  /** "twist, deg" */
  readonly xName: string;
  /** "kg" */
  readonly yName: string;
  readonly curves: readonly Curve[];
  readonly bands: readonly Band[];
  readonly limit: DrawnLimit | null;
  readonly pick: PickNote | null;
  /** where the pick's ring stands, whether or not its note found room */
  readonly ring: Point | null;
  readonly ends: readonly EndLabel[];
}
