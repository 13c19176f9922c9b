import type { WallBuckling } from '../buckling/wall.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Check } from './check.js';
import { Column } from './column.js';
import { StrengthCheck } from './strength.js';
import { WallBucklingCheck } from './wall-buckling.js';
import { Whirl } from './whirl.js';

/**
 * Checks sorted by their kind, so that every call in the inner loop has one kind of check to deal with: the compiler
 * then works its numbers out in place, where a call that may go anywhere makes an object of each.
 */
export class Groups {
  /** the checks in the order of their places */
  readonly all: readonly Check[];
  private readonly whirls: readonly Whirl[];
  private readonly columns: readonly Column[];
  private readonly strengths: readonly StrengthCheck[];
  private readonly walls: readonly WallBucklingCheck[];
  private readonly rest: readonly Check[];

  constructor(checks: readonly Check[]) {
    this.whirls = checks.filter((check) => check instanceof Whirl);
    this.columns = checks.filter((check) => check instanceof Column);
    this.strengths = checks.filter((check) => check instanceof StrengthCheck);
    this.walls = checks.filter((check) => check instanceof WallBucklingCheck);
    const sorted: readonly Check[] = [...this.whirls, ...this.columns, ...this.strengths, ...this.walls];
    this.rest = checks.filter((check) => !sorted.includes(check));
    this.all = [...sorted, ...this.rest];
  }

  /** The only check, where it is the wall's buckling. */
  get lone(): WallBuckling | null {
    return this.all.length === 1 ? (this.walls[0]?.wall ?? null) : null;
  }

  /**
   * What works out U of all checks at a point, into `values`. It comes in parts that are called through a variable, so
   * that the compiler takes each as a whole: what it puts in place it counts, and past a certain sum it stops.
   */
  steps(values: Float64Array): readonly ((at: Section) => void)[] {
    const { whirls, columns, strengths, walls, rest } = this;
    const firstWall = whirls.length + columns.length + strengths.length;
    const firstOfRest = firstWall + walls.length;
    const light = (at: Section): void => {
      let n = 0;
      for (let i = 0; i < whirls.length; i++) values[n++] = (whirls[i] as Whirl).utilisation(at);
      for (let i = 0; i < columns.length; i++) values[n++] = (columns[i] as Column).utilisation(at);
      for (let i = 0; i < strengths.length; i++) values[n++] = (strengths[i] as StrengthCheck).utilisation(at);
    };
    const heavy = (at: Section): void => {
      for (let i = 0; i < walls.length; i++)
        values[firstWall + i] = (walls[i] as WallBucklingCheck).wall.utilisation(at);
    };
    const other = (at: Section): void => {
      for (let i = 0; i < rest.length; i++) values[firstOfRest + i] = (rest[i] as Check).utilisation(at);
    };
    return [
      ...(firstWall > 0 ? [light] : []),
      ...(walls.length > 0 ? [heavy] : []),
      ...(rest.length > 0 ? [other] : []),
    ];
  }

  /** U of all checks enclosed over a box, into the spans from `first` on. */
  bounds(over: Box, spans: readonly Span[], first: number): void {
    const { whirls, columns, strengths, walls, rest } = this;
    let n = first;
    for (let i = 0; i < whirls.length; i++) (whirls[i] as Whirl).bound(over, spans[n++] as Span);
    for (let i = 0; i < columns.length; i++) (columns[i] as Column).bound(over, spans[n++] as Span);
    for (let i = 0; i < strengths.length; i++) (strengths[i] as StrengthCheck).bound(over, spans[n++] as Span);
    for (let i = 0; i < walls.length; i++) (walls[i] as WallBucklingCheck).bound(over, spans[n++] as Span);
    for (let i = 0; i < rest.length; i++) (rest[i] as Check).bound(over, spans[n++] as Span);
  }
}
