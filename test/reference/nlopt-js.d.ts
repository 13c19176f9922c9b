/** What the tests use of nlopt-js, which brings no types of its own. */
declare module 'nlopt-js' {
  /** Value at x; where `gradient` is given, the method wants it filled in. */
  export type Objective = (x: Float64Array, gradient: Float64Array | null) => number;

  export class Optimize {
    constructor(algorithm: unknown, dimensions: number);
    setLowerBounds(bounds: readonly number[]): void;
    setUpperBounds(bounds: readonly number[]): void;
    /** @param tolerance relative: the run ends when steps fall below it; true of a stalled run too, so start from several points */
    setMinObjective(objective: Objective, tolerance: number): void;
    /** The constraint holds where its value is at most 0. */
    addInequalityConstraint(constraint: Objective, tolerance: number): void;
    setMaxeval(evaluations: number): void;
    optimize(start: readonly number[]): { success: boolean; x: number[]; value: number };
  }

  const nlopt: {
    /** Resolves once the library may be called. */
    readonly ready: Promise<unknown>;
    readonly Optimize: typeof Optimize;
    readonly Algorithm: Readonly<Record<'LD_SLSQP' | 'LD_MMA' | 'LN_COBYLA' | 'LN_BOBYQA' | 'GN_ISRES', unknown>>;
    /** Gives back the memory of every problem made so far. */
    readonly GC: { flush(): void };
  };
  export default nlopt;
}
