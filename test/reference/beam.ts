import { EigenvalueDecomposition, Matrix, SingularValueDecomposition } from 'ml-matrix';

/**
 * A pinned shaft by finite differences, with the eigenvalues left to a linear-algebra library: instability and first
 * whirl speed without any of the closed forms. SI.
 */

/** A uniform shaft: EI, N·m²; κGA, N; mass and rotary inertia per length, kg/m and kg·m; span, m. */
export interface Shaft {
  readonly bending: number;
  readonly shear: number;
  readonly massPerLength: number;
  readonly rotaryInertia: number;
  readonly span: number;
}

/** Takes the error of order h² out of results on n, 2n and 4n cells, and then that of order h⁴. */
export function extrapolated(result: (cells: number) => number, cells: number): number {
  const [a, b, c] = [result(cells), result(2 * cells), result(4 * cells)];
  const fine = (4 * c - b) / 3;
  return (16 * fine - (4 * b - a) / 3) / 15;
}

/** −d² on the inner nodes of n cells, w = 0 at both ends; and d by central differences. */
function differences(cells: number, h: number): { minusSecond: Matrix; first: Matrix } {
  const n = cells - 1;
  const minusSecond = Matrix.zeros(n, n);
  const first = Matrix.zeros(n, n);
  for (let i = 0; i < n; i++) {
    minusSecond.set(i, i, 2 / (h * h));
    if (i + 1 >= n) continue;
    minusSecond.set(i, i + 1, -1 / (h * h));
    minusSecond.set(i + 1, i, -1 / (h * h));
    first.set(i, i + 1, 1 / (2 * h));
    first.set(i + 1, i, -1 / (2 * h));
  }
  return { minusSecond, first };
}

const leastEigenvalue = (matrix: Matrix): number =>
  Math.min(...new EigenvalueDecomposition(matrix, { assumeSymmetric: true }).realEigenvalues);

/** Thrust at which a pinned column buckles, N: EI·w'' + P·w = 0. */
export function criticalThrust({ bending, span }: Shaft): number {
  return extrapolated((cells) => bending * leastEigenvalue(differences(cells, span / cells).minusSecond), 12);
}

/**
 * Torque at which a pinned shaft under a given thrust buckles, N·m: EI·w'' − iT·w' + P·w = 0 for the deflection
 * w = y + iz in the two planes. With A = −EI·d² − P, positive definite, and B = d, skew: A·w = −iT·B·w, so 1/T is the
 * greatest singular value of A^(−1/2)·B·A^(−1/2).
 */
export function criticalTorque({ bending, span }: Shaft, thrust: number): number {
  return extrapolated((cells) => {
    const { minusSecond, first } = differences(cells, span / cells);
    const a = Matrix.sub(Matrix.mul(minusSecond, bending), Matrix.mul(Matrix.eye(cells - 1), thrust));
    const { eigenvectorMatrix: v, realEigenvalues } = new EigenvalueDecomposition(a, { assumeSymmetric: true });
    const root = Matrix.diag(realEigenvalues.map((value) => 1 / Math.sqrt(value)));
    const inverseRoot = v.mmul(root).mmul(v.transpose());
    return 1 / Math.max(...new SingularValueDecomposition(inverseRoot.mmul(first).mmul(inverseRoot)).diagonal);
  }, 12);
}

/**
 * First natural frequency, rad/s, of a pinned Timoshenko beam under thrust: deflection w at the nodes and slope ψ
 * between them (which keeps shear from locking), strain energy ½∫(EI·ψ'² + κGA·(w' − ψ)² − P·w'²), kinetic energy
 * ½∫(ρA·ẇ² + ρI·ψ̇²).
 */
export function naturalFrequency(shaft: Shaft, thrust = 0): number {
  const { bending, shear, massPerLength, rotaryInertia, span } = shaft;
  const squared = extrapolated((cells) => {
    const h = span / cells;
    const size = 2 * cells - 1;
    const k = Matrix.zeros(size, size);
    // unknowns in the order of their place: ψ, w, ψ, w, …, ψ
    const add = (weight: number, parts: readonly (readonly [number, number])[]): void => {
      const inside = parts.filter(([i]) => i >= 0 && i < size);
      for (const [i, a] of inside) for (const [j, b] of inside) k.set(i, j, k.get(i, j) + weight * a * b);
    };
    for (let cell = 0; cell < cells; cell++) {
      const slope = 2 * cell;
      const rise = [
        [slope - 1, -1 / h],
        [slope + 1, 1 / h],
      ] as const;
      add(shear * h, [...rise, [slope, -1]]);
      add(-thrust * h, rise);
      if (cell > 0)
        add(bending * h, [
          [slope - 2, -1 / h],
          [slope, 1 / h],
        ]);
    }
    const inertia = (i: number): number => (i % 2 === 0 ? rotaryInertia : massPerLength) * h;
    const scaled = Matrix.zeros(size, size);
    for (let i = 0; i < size; i++) {
      for (let j = 0; j < size; j++) scaled.set(i, j, k.get(i, j) / Math.sqrt(inertia(i) * inertia(j)));
    }
    return leastEigenvalue(scaled);
  }, 10);
  return Math.sqrt(squared);
}

/**
 * What torque and thrust leave of ω² of a slender pinned shaft, as a share: EI·w'''' − iT·w''' + P·w'' = ρA·ω²·w with
 * w = 0 and EI·w'' = iT·w' at the ends, by Galerkin's method on sines. Written for EI = 1 and a span of π, so that P_E = 1
 * and T_cr = 2; the complex matrix as a real one of twice the size.
 */
export function leftOfSquaredFrequency(torqueShare: number, thrustShare: number, terms = 24): number {
  const matrix = Matrix.zeros(2 * terms, 2 * terms);
  for (let m = 1; m <= terms; m++) {
    for (let n = 1; n <= terms; n++) {
      const own = m === n ? n ** 4 - thrustShare * n ** 2 : 0;
      // T·∫w_m'·w_n'' over the span, w_n = sin nx, and over ∫w_m² = π/2
      const twisting = (m + n) % 2 === 0 ? 0 : (2 * torqueShare * m * n ** 3 * 4) / (Math.PI * (n * n - m * m));
      matrix.set(m - 1, n - 1, own);
      matrix.set(terms + m - 1, terms + n - 1, own);
      matrix.set(m - 1, terms + n - 1, twisting);
      matrix.set(terms + m - 1, n - 1, -twisting);
    }
  }
  return Math.min(...new EigenvalueDecomposition(matrix).realEigenvalues);
}

/** Nodes and weights of Gauss's rule on [−1, 1] from the eigenvectors of its Jacobi matrix (Golub & Welsch 1969). */
export function gauss(points: number): { node: number; weight: number }[] {
  const jacobi = Matrix.zeros(points, points);
  for (let i = 1; i < points; i++) {
    jacobi.set(i, i - 1, i / Math.sqrt(4 * i * i - 1));
    jacobi.set(i - 1, i, i / Math.sqrt(4 * i * i - 1));
  }
  const { realEigenvalues, eigenvectorMatrix } = new EigenvalueDecomposition(jacobi, { assumeSymmetric: true });
  return realEigenvalues.map((node, i) => ({ node, weight: 2 * eigenvectorMatrix.get(0, i) ** 2 }));
}
