"""
What an engineer writes in Python: the equations of textbook-life.c over all flaws at once with NumPy, and one flaw
after the other with SciPy's solve_ivp (RK45).

Usage: vectorised_life.py numpy|scipy <flaws> <cycles> <count> <steps or rtol>; prints CPU seconds and evaluations.
"""

import json
import resource
import sys

import numpy as np

C1, M1, C2, M2, THRESHOLD = 2.1e-17, 5.1, 1.29e-12, 2.88, 63.0
TRANSITION = (C1 / C2) ** (1 / (M2 - M1))


def rate(k):
    grown = np.where(k <= TRANSITION, C1 * k**M1, C2 * k**M2)
    return np.where(k < THRESHOLD, 0.0, grown)


def stress_intensity(t, w, sm, sb, a, c):
    d = a / t
    d2 = d * d
    long = a <= c
    r = np.where(long, a / c, c / a)
    root, r75, r4 = np.sqrt(r), r**0.75, r**4
    r15 = r75 * r75
    q = 1 + 1.464 * r**1.65
    m1 = np.where(long, 1.13 - 0.09 * r, root * (1 + 0.04 * r))
    m2 = np.where(long, -0.54 + 0.89 / (0.2 + r), 0.2 * r4)
    m3 = np.where(long, 0.5 - 1 / (0.65 + r) + 14 * (1 - r) ** 24, -0.11 * r4)
    g = 1.1 + 0.35 * np.where(long, 1.0, r) * d2
    h1 = np.where(
        long,
        1 - (0.34 + 0.11 * r) * d,
        1 + (-0.04 - 0.41 * r) * d + (0.55 - 1.93 * r75 + 1.38 * r15) * d2,
    )
    h2 = np.where(
        long,
        1 + (-1.22 - 0.12 * r) * d + (0.55 - 1.05 * r75 + 0.47 * r15) * d2,
        1 + (-2.11 + 0.77 * r) * d + (0.55 - 0.72 * r75 + 0.14 * r15) * d2,
    )
    fw = 1 / np.sqrt(np.cos(np.pi * np.minimum(c / w * np.sqrt(d), 0.499)))
    common = np.sqrt(np.pi * a / q) * (m1 + m2 * d2 + m3 * d2 * d2) * fw
    deepest = np.maximum(common * np.where(long, 1.0, root) * (sm + h2 * sb), 0)
    end = np.maximum(common * np.where(long, root, 1.0) * g * (sm + h1 * sb), 0)
    return deepest, end


def slopes(f, y):
    t, w, _, _, sm, sb, _ = f
    a, c = np.exp(y[0]), np.exp(y[1])
    kd, ke = stress_intensity(t, w, sm, sb, a, c)
    ra, rc = rate(kd) / a, rate(ke) / c
    most = np.maximum(ra, rc)
    with np.errstate(divide="ignore", invalid="ignore"):
        return np.array([ra / most, rc / most, 1 / most]), np.maximum(kd, ke)


def room(f, y, k):
    t, w, limit = f[0], f[1], f[6]
    with np.errstate(divide="ignore"):
        return np.minimum(
            np.minimum(np.log(0.8 * t) - y[0], np.log(0.25 * w) - y[1]), np.log(limit / k)
        )


def step(f, y, k1, h):
    k2, _ = slopes(f, y + 0.5 * h * k1)
    k3, _ = slopes(f, y + 0.5 * h * k2)
    k4, _ = slopes(f, y + h * k3)
    return y + h / 6 * (k1 + 2 * k2 + 2 * k3 + k4)


def all_lives(flaws, steps):
    f = flaws.T.copy()
    lives = np.zeros(len(flaws))
    y = np.array([np.log(f[2]), np.log(f[3]), np.zeros(len(flaws))])
    whole = np.log(0.8 * f[0] / f[2]) / steps
    left = np.arange(len(flaws))
    k1, k = slopes(f, y)
    before = room(f, y, k)
    evaluations = len(flaws)
    while len(left):
        h = whole.copy()
        straight = k1[0] > 0.999999
        h[straight] = np.minimum(h, np.log(0.8 * f[0]) - y[0])[straight]
        new = step(f, y, k1, h)
        k2, k = slopes(f, new)
        after = room(f, new, k)
        evaluations += 4 * len(left)
        over = after <= 1e-12
        if over.any():
            fo, yo, ko = f[:, over], y[:, over], k1[:, over]
            low, room_low = np.zeros(over.sum()), before[over]
            high, room_high, at = h[over], after[over], new[:, over]
            for _ in range(2):
                trial = low + (high - low) * room_low / (room_low - room_high)
                at = step(fo, yo, ko, trial)
                r = room(fo, at, slopes(fo, at)[1])
                evaluations += 4 * len(trial)
                inside = r > 0
                low, room_low = np.where(inside, trial, low), np.where(inside, r, room_low)
                high, room_high = np.where(inside, high, trial), np.where(inside, room_high, r)
            lives[left[over]] = at[2]
        stay = ~over
        f, y, k1, before = f[:, stay], new[:, stay], k2[:, stay], after[stay]
        left, whole = left[stay], whole[stay]
    return lives, evaluations


def one_life(flaw, rtol):
    """One flaw with plain floats, which SciPy calls far faster than small arrays."""
    from math import cos, exp, inf, log, pi, sqrt

    from scipy.integrate import solve_ivp

    t, w, a0, c0, sm, sb, limit = (float(x) for x in flaw)
    count = 0

    def rate_of(k):
        if k < THRESHOLD:
            return 0.0
        return C1 * k**M1 if k <= TRANSITION else C2 * k**M2

    def k_of(a, c):
        d = min(a / t, 1.0)
        d2 = d * d
        if a <= c:
            r = a / c
            r75 = r**0.75
            m1, m2 = 1.13 - 0.09 * r, -0.54 + 0.89 / (0.2 + r)
            m3 = 0.5 - 1 / (0.65 + r) + 14 * (1 - r) ** 24
            g, deep, flat = 1.1 + 0.35 * d2, 1.0, sqrt(r)
            h1 = 1 - (0.34 + 0.11 * r) * d
            h2 = 1 + (-1.22 - 0.12 * r) * d + (0.55 - 1.05 * r75 + 0.47 * r75 * r75) * d2
        else:
            r = c / a
            r75, r4 = r**0.75, r**4
            m1, m2, m3 = sqrt(r) * (1 + 0.04 * r), 0.2 * r4, -0.11 * r4
            g, deep, flat = 1.1 + 0.35 * r * d2, sqrt(r), 1.0
            h1 = 1 + (-0.04 - 0.41 * r) * d + (0.55 - 1.93 * r75 + 1.38 * r75 * r75) * d2
            h2 = 1 + (-2.11 + 0.77 * r) * d + (0.55 - 0.72 * r75 + 0.14 * r75 * r75) * d2
        fw = 1 / sqrt(cos(pi * min(c / w * sqrt(d), 0.499)))
        common = sqrt(pi * a / (1 + 1.464 * r**1.65)) * (m1 + m2 * d2 + m3 * d2 * d2) * fw
        return (
            max(common * deep * (sm + h2 * sb), 0.0),
            max(common * flat * g * (sm + h1 * sb), 0.0),
        )

    def right_hand_side(_, y):
        nonlocal count
        count += 1
        a, c = exp(y[0]), exp(y[1])
        kd, ke = k_of(a, c)
        ra, rc = rate_of(kd) / a, rate_of(ke) / c
        most = max(ra, rc)
        return (ra / most, rc / most, 1 / most) if most > 0 else (0.0, 0.0, inf)

    def end(_, y):
        k = max(*k_of(exp(y[0]), exp(y[1])), 1e-9)
        return min(log(0.8 * t) - y[0], log(0.25 * w) - y[1], log(limit / k))

    end.terminal = True
    way = solve_ivp(
        right_hand_side, (0, 50), [log(a0), log(c0), 0.0], method="RK45", rtol=rtol, events=end
    )
    return way.y[2, -1], count


def main():
    how, source, target, count, setting = sys.argv[1:6]
    flaws = np.fromfile(source)[: 7 * int(count)].reshape(-1, 7)
    flaws[np.isinf(flaws[:, 1]), 1] = 1e12
    if how == "scipy":
        import scipy.integrate  # noqa: F401  the import is not part of what is measured
    start = resource.getrusage(resource.RUSAGE_SELF).ru_utime
    if how == "numpy":
        lives, evaluations = all_lives(flaws, int(setting))
    else:
        pairs = [one_life(flaw, float(setting)) for flaw in flaws]
        lives = np.array([life for life, _ in pairs])
        evaluations = sum(n for _, n in pairs)
    seconds = resource.getrusage(resource.RUSAGE_SELF).ru_utime - start
    lives.tofile(target)
    print(json.dumps({"seconds": seconds, "evaluations": evaluations}))


main()
