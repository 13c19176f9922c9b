/**
 * Donnell's equation for a simply supported cylinder in torsion by Galerkin's method (Batdorf, Stein and Schildcrout,
 * NACA TN 1344, from memory): w is a sum of sin(mπx/L) with the wave running round the tube, and 1/k is the largest
 * singular value of C_mn/√(D_m·D_n) for the worst wave length, where
 * D_m = (π/8β)·[(m² + β²)² + 12Z²m⁴/(π⁴(m² + β²)²)] and C_mn = mn/(m² − n²) for m + n odd.
 * A check of the coefficient 0.85 that owes nothing to the engine.
 */
function largestSingular(matrix: readonly (readonly number[])[]): number {
  let vector = matrix.map((_, i) => 1 / (i + 1));
  let size = 0;
  for (let turn = 0; turn < 200; turn++) {
    const once = matrix.map((line) => line.reduce((sum, a, j) => sum + a * vector[j]!, 0));
    const twice = matrix.map((line) => -line.reduce((sum, a, j) => sum + a * once[j]!, 0));
    size = Math.hypot(...twice);
    vector = twice.map((x) => x / size);
  }
  return Math.sqrt(size);
}

function coefficient(Z: number, beta: number, terms: number): number {
  const waves = Array.from({ length: terms }, (_, i) => i + 1);
  const D = waves.map((m) => {
    const q = (m * m + beta * beta) ** 2;
    return (Math.PI / (8 * beta)) * (q + (12 * Z * Z * m ** 4) / (Math.PI ** 4 * q));
  });
  const matrix = waves.map((m, i) =>
    waves.map((n, j) => ((m + n) % 2 === 1 ? (m * n) / (m * m - n * n) / Math.sqrt(D[i]! * D[j]!) : 0)),
  );
  return 1 / largestSingular(matrix);
}

/** Waves along the tube that are counted: four digits of k at the longest tubes tabled. */
const TERMS = 40;

/** k in τ = k·π²E/(12(1 − ν²))·(t/L)², least over the wave length round the tube (golden section in ln β). */
export function galerkin(Z: number): number {
  const golden = (Math.sqrt(5) - 1) / 2;
  const guess = Math.log(Math.max(0.7, 0.5 * Z ** 0.25));
  let [a, b] = [guess - 1, guess + 1.5];
  for (let turn = 0; turn < 24; turn++) {
    const [c, d] = [b - golden * (b - a), a + golden * (b - a)];
    if (coefficient(Z, Math.exp(c), TERMS) < coefficient(Z, Math.exp(d), TERMS)) b = d;
    else a = c;
  }
  return coefficient(Z, Math.exp((a + b) / 2), TERMS);
}
