import { AxisScale, type MapPoint } from '../sizing/mapScale.js';
import type { MapAxes } from './mapAxes.js';
import type { Point } from './point.js';

/** A rectangle on a drawing, px. */
export interface Area {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** Room about the plot for figures and names, px. */
const MARGINS = { left: 48, top: 12, right: 58, bottom: 30 } as const;

/** A wall map's sheet: where a tube stands on it, and which tube stands at a place. */
export class MapSheet {
  readonly plot: Area;
  private readonly outer: AxisScale;
  private readonly wall: AxisScale;

  constructor(
    readonly axes: MapAxes,
    readonly width: number,
    readonly height: number,
  ) {
    const { left, top, right, bottom } = MARGINS;
    this.plot = { left, top, right: width - right, bottom: height - bottom };
    this.outer = new AxisScale(axes.outer.lo, axes.outer.hi, axes.outer.log);
    this.wall = new AxisScale(axes.wall.lo, axes.wall.hi, axes.wall.log);
  }

  x(outerDiameter: number): number {
    const { left, right } = this.plot;
    return left + this.outer.share(outerDiameter) * (right - left);
  }

  y(wall: number): number {
    const { top, bottom } = this.plot;
    return bottom - this.wall.share(wall) * (bottom - top);
  }

  at({ outerDiameter, wall }: MapPoint): Point {
    return { x: this.x(outerDiameter), y: this.y(wall) };
  }

  /** The tube at a place on the sheet. */
  tubeAt({ x, y }: Point): MapPoint {
    const { left, top, right, bottom } = this.plot;
    return {
      outerDiameter: this.outer.at((x - left) / (right - left)),
      wall: this.wall.at((bottom - y) / (bottom - top)),
    };
  }

  /** Whether a place lies in the plot. */
  holds({ x, y }: Point): boolean {
    const { left, top, right, bottom } = this.plot;
    return x >= left && x <= right && y >= top && y <= bottom;
  }
}
