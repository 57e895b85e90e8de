/*
 * The textbook program the engine is measured against: life of a semi-elliptical surface crack in a plate.
 * Newman and Raju 1984 at the deepest point and the end, two-stage Paris law with a threshold, a and c together
 * by the classical Runge-Kutta method in ten steps of ln a, the last step shortened onto the end by the secant.
 *
 * cc -O3 -march=native textbook-life.c -lm; reads flaws as doubles (t W a c Sm Sb Klimit), writes cycles.
 * Usage: textbook-life <flaws> <cycles> <count> <repeats> <steps>; prints CPU seconds and evaluations.
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <sys/resource.h>

typedef struct { double t, w, a, c, sm, sb, limit; } Flaw;

static const double C1 = 2.1e-17, M1 = 5.1, C2 = 1.29e-12, M2 = 2.88, THRESHOLD = 63.0;
static double transition;
static long evaluations;

static double rate(double k) {
  if (k < THRESHOLD) return 0.0;
  return k <= transition ? C1 * pow(k, M1) : C2 * pow(k, M2);
}

static void stress_intensity(const Flaw *f, double a, double c, double *deepest, double *end) {
  const double d = a / f->t, d2 = d * d;
  double m1, m2, m3, g, fd, fe, h1, h2, q;
  if (a <= c) {
    const double r = a / c, r75 = pow(r, 0.75), r15 = pow(r, 1.5);
    q = 1.0 + 1.464 * pow(r, 1.65);
    m1 = 1.13 - 0.09 * r;
    m2 = -0.54 + 0.89 / (0.2 + r);
    m3 = 0.5 - 1.0 / (0.65 + r) + 14.0 * pow(1.0 - r, 24.0);
    g = 1.1 + 0.35 * d2;
    fd = 1.0;
    fe = sqrt(r);
    h1 = 1.0 - 0.34 * d - 0.11 * r * d;
    h2 = 1.0 + (-1.22 - 0.12 * r) * d + (0.55 - 1.05 * r75 + 0.47 * r15) * d2;
  } else {
    const double r = c / a, r75 = pow(r, 0.75), r15 = pow(r, 1.5), r4 = pow(r, 4.0);
    q = 1.0 + 1.464 * pow(r, 1.65);
    m1 = sqrt(r) * (1.0 + 0.04 * r);
    m2 = 0.2 * r4;
    m3 = -0.11 * r4;
    g = 1.1 + 0.35 * r * d2;
    fd = sqrt(r);
    fe = 1.0;
    h1 = 1.0 + (-0.04 - 0.41 * r) * d + (0.55 - 1.93 * r75 + 1.38 * r15) * d2;
    h2 = 1.0 + (-2.11 + 0.77 * r) * d + (0.55 - 0.72 * r75 + 0.14 * r15) * d2;
  }
  const double fw = 1.0 / sqrt(cos(M_PI * fmin(c / f->w * sqrt(d), 0.499)));
  const double common = sqrt(M_PI * a / q) * (m1 + m2 * d2 + m3 * d2 * d2) * fw;
  *deepest = fmax(common * fd * (f->sm + h2 * f->sb), 0.0);
  *end = fmax(common * fe * g * (f->sm + h1 * f->sb), 0.0);
}

/* d(ln a, ln c, N)/ds, s the larger of ln a and ln c; returns the greater K */
static double slopes(const Flaw *f, const double y[3], double dy[3]) {
  const double a = exp(y[0]), c = exp(y[1]);
  double kd, ke;
  stress_intensity(f, a, c, &kd, &ke);
  evaluations++;
  const double ra = rate(kd) / a, rc = rate(ke) / c, most = fmax(ra, rc);
  dy[0] = most > 0 ? ra / most : 0.0;
  dy[1] = most > 0 ? rc / most : 0.0;
  dy[2] = 1.0 / most;
  return fmax(kd, ke);
}

/* one step; k1 is known */
static void step(const Flaw *f, const double y[3], const double k1[3], double h, double out[3]) {
  double k2[3], k3[3], k4[3], at[3];
  for (int i = 0; i < 3; i++) at[i] = y[i] + 0.5 * h * k1[i];
  slopes(f, at, k2);
  for (int i = 0; i < 3; i++) at[i] = y[i] + 0.5 * h * k2[i];
  slopes(f, at, k3);
  for (int i = 0; i < 3; i++) at[i] = y[i] + h * k3[i];
  slopes(f, at, k4);
  for (int i = 0; i < 3; i++) out[i] = y[i] + h / 6.0 * (k1[i] + 2.0 * k2[i] + 2.0 * k3[i] + k4[i]);
}

/* room to the nearest end, in logarithms */
static double room(const Flaw *f, const double y[3], double k) {
  const double depth = log(0.8 * f->t) - y[0];
  const double length = log(0.25 * f->w) - y[1];
  return fmin(fmin(depth, length), log(f->limit / k));
}

static double life(const Flaw *f, int steps) {
  double y[3] = {log(f->a), log(f->c), 0.0}, k1[3], k2[3], next[3];
  double k = slopes(f, y, k1);
  double before = room(f, y, k);
  const double whole = log(0.8 * f->t / f->a) / steps;
  if (before <= 0) return 0.0;
  for (int n = 0; n < 100 * steps; n++) {
    if (isinf(k1[2])) return INFINITY;
    double h = whole;
    if (k1[0] > 0.999999) h = fmin(h, log(0.8 * f->t) - y[0]);
    step(f, y, k1, h, next);
    k = slopes(f, next, k2);
    double after = room(f, next, k);
    if (after <= 1e-12) {
      double low = 0.0, roomLow = before, high = h, roomHigh = after;
      for (int i = 0; i < 3 && fabs(after) > 1e-4; i++) {
        h = low + (high - low) * roomLow / (roomLow - roomHigh);
        step(f, y, k1, h, next);
        k = slopes(f, next, k2);
        after = room(f, next, k);
        if (after > 0) low = h, roomLow = after;
        else high = h, roomHigh = after;
      }
      return next[2];
    }
    for (int i = 0; i < 3; i++) y[i] = next[i], k1[i] = k2[i];
    before = after;
  }
  return y[2];
}

int main(int argc, char **argv) {
  if (argc < 6) return 2;
  const int count = atoi(argv[3]), repeats = atoi(argv[4]), steps = atoi(argv[5]);
  Flaw *flaws = malloc(sizeof(Flaw) * count);
  double *cycles = malloc(sizeof(double) * count);
  FILE *in = fopen(argv[1], "rb");
  if (!in || fread(flaws, sizeof(Flaw), count, in) != (size_t)count) return 3;
  fclose(in);
  transition = pow(C1 / C2, 1.0 / (M2 - M1));
  struct rusage from, to;
  getrusage(RUSAGE_SELF, &from);
  for (int r = 0; r < repeats; r++)
    for (int i = 0; i < count; i++) cycles[i] = life(&flaws[i], steps);
  getrusage(RUSAGE_SELF, &to);
  const double seconds = (to.ru_utime.tv_sec - from.ru_utime.tv_sec) + 1e-6 * (to.ru_utime.tv_usec - from.ru_utime.tv_usec);
  FILE *out = fopen(argv[2], "wb");
  if (!out) return 4;
  fwrite(cycles, sizeof(double), count, out);
  fclose(out);
  printf("{\"seconds\":%.6f,\"evaluations\":%ld}\n", seconds / repeats, evaluations / repeats);
  return 0;
}
