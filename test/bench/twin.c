/*
 * The limits of a metal tube in C, for the speed of the kernel to be measured against: the same arithmetic on the same
 * points and boxes, constants hoisted, plain loops. Reads a job as numbers on standard input (see twin.ts for the
 * order), and prints nanoseconds and the sum of all results, for points and then for boxes.
 */
#define _POSIX_C_SOURCE 199309L
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define PI 3.141592653589793
#define MAX_LOADS 8

typedef struct { double lo, hi, d0, d1, t0, t1; } Span;
typedef struct { double D, t, tc, ro, r, A, g, I, perI, stress, decay; } Section;
typedef struct {
  double D0, D1, t0, t1, slim0, slim1;
  Span r, q, A, g, I, perI, stress;
  double e0, e1, flattest, steepest; /* e^−φ at the ends of phi, and the least and the greatest of φe^−φ */
} Box;

typedef struct {
  int torsion, axial, bending, thrust, twist, allowable, column, wall;
  double ky, kyAxial, kyBending, ku, kuAxial, kuBending; /* strength: n·T/(j·Fs), n·|N|/(j·Ft), n·M/(j·Ft) */
  double thrustY, thrustU, thrustB;                      /* n·P/(P_E·I⁻¹) of the amplification */
  double ka, kt;                                         /* T/τ_max, T·L/(G·θ_max) */
  double nbT, nbP, nbM2;                                 /* n_b·T, n_b·P, 2·n_b·M */
  double kc;                                             /* n_b·T/(2πE/Ls) */
  double whirlP, whirlT;
} Load;

static double kept, slimmest, wallMin, outerMax, boreMin, slimMin, slimMax;
static double E, G, nu, rho, Fty, Ftu, Fsy, Fsu, Fcy, joint, L, Ls, kappa, speed;
static double moderate, longForm, plateau, classical, euler, stiffness, shear;
static int loads, direct; /* direct: some load case has thrust or bending */
static Load load[MAX_LOADS];
/* the strictest factor on ro/J and on 1/I, of the limits that are multiples of these */
static double perTorque, perMoment;

static double number(void) {
  double x;
  if (scanf("%lf", &x) != 1) exit(2);
  return x;
}

static void read_load(Load *c) {
  double T = fabs(number()), M = number(), N = number(), twist = number(), allowable = number();
  double ny = number(), nu_ = number(), nb = number();
  double P = N < 0 ? -N : 0, pe = PI * PI * E / (Ls * Ls);
  c->torsion = T > 0, c->axial = N != 0, c->bending = M > 0, c->thrust = P > 0;
  c->twist = T > 0 && twist > 0, c->allowable = T > 0 && allowable > 0;
  c->wall = T > 0 || M > 0 || P > 0, c->column = T > 0 || P > 0;
  c->ky = ny / joint * T / Fsy, c->kyAxial = ny / joint * fabs(N) / Fty, c->kyBending = ny / joint * M / Fty;
  c->ku = nu_ / joint * T / Fsu, c->kuAxial = nu_ / joint * fabs(N) / Ftu, c->kuBending = nu_ / joint * M / Ftu;
  c->thrustY = ny * P / pe, c->thrustU = nu_ * P / pe, c->thrustB = nb * P / pe;
  c->ka = c->allowable ? T / allowable : 0, c->kt = c->twist ? T * L / (G * twist) : 0;
  c->nbT = nb * T, c->nbP = nb * P, c->nbM2 = 2 * nb * M;
  c->kc = nb * T * Ls / (2 * PI * E);
  c->whirlP = P / pe, c->whirlT = T * Ls / (2 * PI * E);
}

static void read_job(void) {
  kept = number(), slimmest = number();
  wallMin = number(), outerMax = number(), boreMin = number(), slimMin = number(), slimMax = number();
  E = number(), G = number(), nu = number(), rho = number();
  Fty = number(), Ftu = number(), Fsy = number(), Fsu = number(), Fcy = number(), joint = number();
  L = number(), Ls = number(), kappa = number(), speed = number();
  double m = 1 - nu * nu, wave = PI / Ls;
  moderate = kappa * 0.85 * PI * PI * E / (12 * pow(m, 0.625) * sqrt(L));
  longForm = pow(kappa, 4.0 / 3) * E / (3 * sqrt(2) * pow(m, 0.75));
  plateau = fmin(Fsu, 1.2 * Fsy);
  classical = E / sqrt(3 * m);
  euler = PI * PI * E / (Ls * Ls);
  stiffness = wave * wave * sqrt(E / rho);
  shear = wave * wave * (1 + E / (2 * (1 + nu) / (4 + 3 * nu) * G));
  loads = (int)number();
  for (int i = 0; i < loads; i++) {
    read_load(&load[i]);
    const Load *c = &load[i];
    direct |= c->thrust | c->bending;
    if (!c->axial && !c->bending) perTorque = fmax(perTorque, fmax(c->ky, c->ku));
    if (c->allowable) perTorque = fmax(perTorque, c->ka);
    if (c->twist) perMoment = fmax(perMoment, 0.5 * c->kt);
    if (!c->thrust) perMoment = fmax(perMoment, c->kc);
  }
}

static inline double least(double a, double b) { return a < b ? a : b; }
static inline double most(double a, double b) { return a > b ? a : b; }

/* at a point */

static inline double parabola(double e, double p) { return e >= p / 2 ? p * (1 - p / (4 * e)) : e; }
static inline double interaction(double c, double s) { return 0.5 * (c + sqrt(c * c + 4 * s * s)); }
static inline double amplified(double x) { return 1 / (1 - (x < 0.999 ? x : 0.999)); }

static inline double strength(const Section *s, const Load *c, double k, double ka, double kb, double thrust) {
  double tau = k * s->stress;
  if (!c->axial && !c->bending) return tau;
  double sigma = ka / s->A;
  if (c->bending) sigma += kb * amplified(thrust * s->perI) * s->ro * s->perI;
  return sqrt(sigma * sigma + tau * tau);
}

static inline double direct_stress(double q, double decay, double loss) {
  return parabola((1 - loss * (1 - decay)) * classical * q, Fcy);
}

static inline double wall(const Section *s, const Load *c) {
  double q = s->tc / s->r, root = sqrt(q), rA = s->r * s->A;
  double e = q * fmax(moderate * sqrt(root * s->r), longForm * root);
  double rs = c->nbT / (rA * parabola(e, plateau)), direct = 0;
  if (!c->thrust && !c->bending) return rs;
  if (c->thrust) direct += c->nbP / s->A / direct_stress(q, s->decay, 0.901);
  if (c->bending) direct += c->nbM2 * amplified(c->thrustB * s->perI) / rA / direct_stress(q, s->decay, 0.731);
  return interaction(direct, rs);
}

static inline double column(const Section *s, const Load *c) {
  double twisting = c->kc * s->perI;
  return c->thrust ? interaction(c->nbP / (s->A * parabola(euler * s->g, Fcy)), twisting) : twisting;
}

static inline double whirl(const Section *s, const Load *c) {
  double twisting = c->whirlT * s->perI;
  double left = fmax(1 - c->whirlP * s->perI - twisting * twisting, 1e-6);
  return speed / (stiffness * sqrt(s->g * left / (1 + shear * s->g)));
}

static double at_point(double D, double t) {
  Section s;
  s.D = D, s.t = t, s.tc = t * kept, s.ro = D / 2, s.r = s.ro - s.tc / 2;
  s.A = 2 * PI * s.r * s.tc, s.g = s.r * s.r * 0.5 + s.tc * s.tc * 0.125, s.I = s.A * s.g;
  s.perI = 1 / s.I, s.stress = 0.5 * s.ro * s.perI;
  if (direct) s.decay = exp(-sqrt(s.r / s.tc) / 16);
  double u = most(perTorque * s.stress, perMoment * s.perI);
  u = most(u, outerMax > 0 ? D / outerMax : 0);
  u = most(u, wallMin / t);
  u = most(u, slimMin / (D / t));
  u = most(u, D / t / slimMax);
  u = most(u, boreMin / (D - 2 * t));
  for (int i = 0; i < loads; i++) {
    const Load *c = &load[i];
    if (c->axial || c->bending) {
      u = most(u, strength(&s, c, c->ky, c->kyAxial, c->kyBending, c->thrustY));
      u = most(u, strength(&s, c, c->ku, c->kuAxial, c->kuBending, c->thrustU));
    }
    if (c->wall) u = most(u, wall(&s, c));
    if (c->thrust) u = most(u, column(&s, c));
    if (speed > 0) u = most(u, whirl(&s, c));
  }
  return u;
}

/* over a box */

static inline Span homogeneous(double lo, double hi, double d0, double d1, double degree) {
  return (Span){lo, hi, d0, d1, degree - d1, degree - d0};
}
static inline Span scaled(Span a, double c) { return a.lo *= c, a.hi *= c, a; }
static inline Span inverse(Span a, double c) { return (Span){c / a.hi, c / a.lo, -a.d1, -a.d0, -a.t1, -a.t0}; }
static inline Span product(Span a, Span b) {
  return (Span){a.lo * b.lo, a.hi * b.hi, a.d0 + b.d0, a.d1 + b.d1, a.t0 + b.t0, a.t1 + b.t1};
}
static inline double share(double a, double b, double w, double v) { return b + (a - b) * (a > b ? w : v); }
static inline Span mix(Span a, Span b, double w0, double w1) {
  return (Span){0, 0, share(a.d0, b.d0, w0, w1), share(a.d1, b.d1, w1, w0), share(a.t0, b.t0, w0, w1), share(a.t1, b.t1, w1, w0)};
}
static inline Span sum_of(Span a, Span b) {
  Span s = mix(a, b, a.lo / (a.lo + b.hi), a.hi / (a.hi + b.lo));
  return s.lo = a.lo + b.lo, s.hi = a.hi + b.hi, s;
}
static inline Span hypotenuse(Span a, Span b) {
  double a0 = a.lo * a.lo, a1 = a.hi * a.hi, b0 = b.lo * b.lo, b1 = b.hi * b.hi;
  Span s = mix(a, b, a0 / (a0 + b1), a1 / (a1 + b0));
  return s.lo = sqrt(a0 + b0), s.hi = sqrt(a1 + b1), s;
}
static inline Span growing(Span a, double f0, double f1) {
  return (Span){0, 0, a.d0 * (a.d0 < 0 ? f1 : f0), a.d1 * (a.d1 < 0 ? f0 : f1),
                a.t0 * (a.t0 < 0 ? f1 : f0), a.t1 * (a.t1 < 0 ? f0 : f1)};
}
static inline Span interaction_over(Span c, Span s) {
  double w0 = c.lo / sqrt(c.lo * c.lo + 4 * s.hi * s.hi), w1 = c.hi / sqrt(c.hi * c.hi + 4 * s.lo * s.lo);
  Span u = mix(c, s, w0, w1);
  return u.lo = interaction(c.lo, s.lo), u.hi = interaction(c.hi, s.hi), u;
}
static inline double slope(double e, double p) {
  if (e < p / 2) return 1;
  double z = p / (4 * e);
  return z / (1 - z);
}
static inline Span parabola_over(Span e, double p) {
  Span f = growing(e, slope(e.hi, p), slope(e.lo, p));
  return f.lo = parabola(e.lo, p), f.hi = parabola(e.hi, p), f;
}
static inline Span amplified_over(const Box *b, double thrust) {
  if (thrust == 0) return homogeneous(1, 1, 0, 0, 0);
  Span x = scaled(b->perI, thrust);
  double x0 = least(x.lo - 4e-15, 0.999), x1 = least(x.hi + 4e-15, 0.999);
  double m0 = 1 / (1 - x0), m1 = 1 / (1 - x1);
  Span m = growing(x, x1 == 0.999 ? 0 : x0 * m0, x0 == 0.999 ? 0 : x1 * m1);
  return m.lo = m0, m.hi = m1, m;
}
static inline Span strength_over(const Box *b, const Load *c, double k, double ka, double kb, double thrust) {
  Span tau = scaled(b->stress, k), sigma;
  if (!c->axial && !c->bending) return tau;
  if (c->axial) sigma = inverse(b->A, ka);
  if (c->bending) {
    Span bend = product(scaled(b->stress, 2 * kb), amplified_over(b, thrust));
    sigma = c->axial ? sum_of(sigma, bend) : bend;
  }
  return c->torsion ? hypotenuse(tau, sigma) : sigma;
}
static inline Span force_over(const Box *b, double loss) {
  Span q = b->q, A = b->A;
  double g0 = 1 - loss * (1 - b->e1), g1 = 1 - loss * (1 - b->e0);
  double k0 = A.d0, k1 = A.d1, lo = g0 * classical * q.lo, hi = g1 * classical * q.hi;
  double e0 = slope(hi, Fcy) * (1 + 0.5 * loss * b->flattest / g1);
  double e1 = slope(lo, Fcy) * (1 + 0.5 * loss * b->steepest / g0);
  double d0 = (1 - e1) * (1 - e1 < 0 ? k1 : k0), d1 = (1 - e0) * (1 - e0 < 0 ? k0 : k1);
  return homogeneous(A.lo * parabola(lo, Fcy), A.hi * parabola(hi, Fcy), d0, d1, 2);
}
static inline Span stress_over(const Box *b) {
  double q0 = b->q.lo, q1 = b->q.hi, k0 = b->r.d0, k1 = b->r.d1, root0 = sqrt(q0), root1 = sqrt(q1);
  double m0 = moderate * q0 * sqrt(root0 * b->r.lo), m1 = moderate * q1 * sqrt(root1 * b->r.hi);
  double l0 = longForm * q0 * root0, l1 = longForm * q1 * root1;
  if (m0 >= l1) return homogeneous(m0, m1, -0.75 * k1, -0.75 * k0, 0.5);
  if (l0 >= m1) return homogeneous(l0, l1, -1.5 * k1, -1.5 * k0, 0);
  return (Span){most(m0, l0), most(m1, l1), -1.5 * k1, -0.75 * k0, least(0.5 + 0.75 * k0, 1.5 * k0), most(0.5 + 0.75 * k1, 1.5 * k1)};
}
static inline Span wall_over(const Box *b, const Load *c) {
  Span rs, direct, rA = product(b->r, b->A);
  if (c->torsion) {
    rs = inverse(product(rA, parabola_over(stress_over(b), plateau)), c->nbT);
    if (!c->thrust && !c->bending) return rs;
  }
  if (c->thrust) direct = inverse(force_over(b, 0.901), c->nbP);
  if (c->bending) {
    Span bend = product(inverse(product(force_over(b, 0.731), b->r), c->nbM2), amplified_over(b, c->thrustB));
    direct = c->thrust ? sum_of(direct, bend) : bend;
  }
  return c->torsion ? interaction_over(direct, rs) : direct;
}
static inline Span column_over(const Box *b, const Load *c) {
  Span twisting = scaled(b->perI, c->kc);
  if (!c->thrust) return twisting;
  Span crush = inverse(product(parabola_over(scaled(b->g, euler), Fcy), b->A), c->nbP);
  return c->torsion ? interaction_over(crush, twisting) : crush;
}
static inline Span whirl_over(const Box *b, const Load *c) {
  Span g = b->g, i = b->perI;
  double z0 = 1 / (1 + shear * g.lo), z1 = 1 / (1 + shear * g.hi);
  double p0 = c->whirlP * i.lo, p1 = c->whirlP * i.hi, t0 = c->whirlT * i.lo, t1 = c->whirlT * i.hi;
  t0 *= t0, t1 *= t1;
  double hi = most(1 - p0 - t0 + 1e-14, 1e-6), lo = most(1 - p1 - t1 - 1e-14, 1e-6);
  double f0 = lo > 1e-6 ? (0.5 * p0 + t0) / hi : 0, f1 = hi > 1e-6 ? (0.5 * p1 + t1) / lo : 0;
  Span w = product(growing(g, 0.5 * z1, 0.5 * z0), growing(b->I, f0, f1));
  w.lo = stiffness * sqrt(g.lo * z0 * lo), w.hi = stiffness * sqrt(g.hi * z1 * hi);
  return inverse(w, speed);
}

static void set_box(Box *b, double D0, double D1, double t0, double t1) {
  b->D0 = D0, b->D1 = D1, b->t0 = t0, b->t1 = t1;
  b->slim0 = most(D0 / t1, slimmest), b->slim1 = most(D1 / t0, b->slim0);
  double ro0 = D0 / 2, ro1 = D1 / 2, c0 = t0 * kept, c1 = t1 * kept;
  double s0 = 2 * kept / b->slim1, s1 = 2 * kept / b->slim0, k0 = 1 / (1 - s0 / 2), k1 = 1 / (1 - s1 / 2);
  double r0 = most(ro0 - c1 / 2, ro0 / k1), r1 = most(ro1 - c0 / 2, r0), q0 = s0 * k0, q1 = s1 * k1;
  double f0 = q0 * q0 * 0.25, f1 = q1 * q1 * 0.25;
  double i0 = k0 * (3 - 2 * f1 / (1 + f1)), i1 = k1 * (3 - 2 * f0 / (1 + f0));
  double g0 = r0 * r0 * 0.5 + c0 * c0 * 0.125, g1 = r1 * r1 * 0.5 + c1 * c1 * 0.125;
  b->r = homogeneous(r0, r1, k0, k1, 1);
  b->q = homogeneous(q0, q1, -k1, -k0, 0), b->g = homogeneous(g0, g1, i0 - k0, i1 - k1, 2);
  double roA = most(D0, t0 * slimmest) / 2, cB = least(t1, D1 / slimmest) * kept, rA = roA - c0 / 2, rB = ro1 - cB / 2;
  double aA = 2 * PI * rA * c0, aB = 2 * PI * rB * cB;
  double IA = aA * (rA * rA * 0.5 + c0 * c0 * 0.125), IB = aB * (rB * rB * 0.5 + cB * cB * 0.125);
  b->A = homogeneous(aA, aB, k0, k1, 2), b->I = homogeneous(IA, IB, i0, i1, 4);
  b->perI = homogeneous(1 / IB, 1 / IA, -i1, -i0, -4);
  b->stress = homogeneous(0.5 * ro1 * (1 / IB), 0.5 * roA * (1 / IA), 1 - i1, 1 - i0, -3);
  if (!direct) return;
  double p0 = 0.0625 / sqrt(q1), p1 = 0.0625 / sqrt(q0);
  b->e0 = exp(-p0), b->e1 = exp(-p1);
  double h0 = p0 * b->e0, h1 = p1 * b->e1;
  b->flattest = least(h0, h1), b->steepest = p0 < 1 && p1 > 1 ? 0.36787944117144233 : most(h0, h1);
}

static inline double total(Span s) { return s.lo + s.hi + s.d0 + s.d1 + s.t0 + s.t1; }

static double over_box(double D0, double D1, double t0, double t1) {
  Box b;
  set_box(&b, D0, D1, t0, t1);
  double sum = 0;
  if (perTorque > 0) sum += total(scaled(b.stress, perTorque));
  if (perMoment > 0) sum += total(scaled(b.perI, perMoment));
  for (int i = 0; i < loads; i++) {
    const Load *c = &load[i];
    if (c->axial || c->bending) {
      sum += total(strength_over(&b, c, c->ky, c->kyAxial, c->kyBending, c->thrustY));
      sum += total(strength_over(&b, c, c->ku, c->kuAxial, c->kuBending, c->thrustU));
    }
    if (c->wall) sum += total(wall_over(&b, c));
    if (c->thrust) sum += total(column_over(&b, c));
    if (speed > 0) sum += total(whirl_over(&b, c));
  }
  if (wallMin > 0) sum += total((Span){wallMin / t1, wallMin / t0, 0, 0, -1, -1});
  if (outerMax > 0) sum += total((Span){D0 / outerMax, D1 / outerMax, 1, 1, 0, 0});
  if (boreMin > 0) {
    double k0 = 1 / (1 - 2 / b.slim1), k1 = 1 / (1 - 2 / b.slim0);
    double lo = most(D0 - 2 * t1, D0 / k1), hi = most(D1 - 2 * t0, lo);
    sum += total(homogeneous(boreMin / hi, boreMin / lo, -k1, -k0, -1));
  }
  sum += total((Span){slimMin / b.slim1, slimMin / b.slim0, -1, -1, 1, 1});
  sum += total((Span){b.slim0 / slimMax, b.slim1 / slimMax, 1, 1, -1, -1});
  return sum;
}

static double seconds(void) {
  struct timespec now;
  clock_gettime(CLOCK_MONOTONIC, &now);
  return now.tv_sec + 1e-9 * now.tv_nsec;
}

static int ascending(const void *a, const void *b) {
  double x = *(const double *)a, y = *(const double *)b;
  return (x > y) - (x < y);
}

int main(void) {
  read_job();
  int n = (int)number(), rounds = (int)number();
  double growth = number(), *D = malloc(n * sizeof *D), *t = malloc(n * sizeof *t), *took = malloc(rounds * sizeof *took);
  for (int i = 0; i < n; i++) D[i] = number(), t[i] = number();
  for (int boxes = 0; boxes < 2; boxes++) {
    double sum = 0;
    for (int k = 0; k < rounds; k++) {
      double began = seconds();
      sum = 0;
      for (int i = 0; i < n; i++)
        sum += boxes ? over_box(D[i], D[i] * growth, t[i], t[i] * growth) : at_point(D[i], t[i]);
      took[k] = (seconds() - began) / n * 1e9;
    }
    qsort(took, rounds, sizeof *took, ascending);
    printf("%.17g %.17g\n", took[rounds / 2], sum);
  }
  free(D), free(t), free(took);
  return 0;
}
