/** ∫f over [from, to] by Simpson's rule in 2000 strips. */
export function simpson(f: (x: number) => number, from: number, to: number): number {
  const strips = 2000;
  const h = (to - from) / strips;
  let sum = f(from) + f(to);
  for (let i = 1; i < strips; i++) sum += (i % 2 === 1 ? 4 : 2) * f(from + i * h);
  return (sum * h) / 3;
}
