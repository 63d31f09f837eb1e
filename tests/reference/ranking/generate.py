"""An independent witness for chances and holding winds: closed forms, plain halving, standard library only.

Run from this folder: python3 generate.py > cases.json
"""
import json
import math
import random
from statistics import NormalDist

NORMAL = NormalDist()
KN = 1852 / 3600
LBF = 0.45359237 * 9.80665
GUST = {"atSea": 1.23, "onshoreWind": 1.38, "offshoreWind": 1.52, "inland": 1.66}
TABLE_30KN_LBF = 900  # sail, 35 ft row, for 10.0 x 3.0 m: the load table in the manner of ABYC H-40, from memory
TAU_F = 0.25


def angle(load, height, length, weight):
    """Shank angle in rad of a chain on a flat bottom, from the catenary's closed form."""
    a = load / weight
    if length >= math.sqrt(height * height + 2 * height * a):
        return 0.0
    half = math.asinh(math.sqrt(length * length - height * height) / (2 * a))
    v0 = weight / 2 * (height / math.tanh(half) - length)
    return math.atan(max(0.0, v0) / load)


def uplift(rad):
    deg = math.degrees(rad)
    points = [(0, 1), (5, 0.75), (10, 0.6), (15, 0.41), (25, 0.1)]
    for (x0, y0), (x1, y1) in zip(points, points[1:]):
        if deg <= x1:
            return y0 + (y1 - y0) * (deg - x0) / (x1 - x0)
    return 0.1


def tau_r(rad):
    return 0.1 * min(math.degrees(rad) / 5, 1) / uplift(rad)


def halve(test, top):
    """Greatest speed up to top that passes a test which only fails from some speed on; None when it passes at top."""
    if test(top):
        return None
    low, high = 0.0, top
    for _ in range(200):
        middle = (low + high) / 2
        if test(middle):
            low = middle
        else:
            high = middle
    return low


def one_case(draw):
    drag_area = draw.uniform(6, 16)
    exposure = draw.choice(list(GUST))
    kind = draw.choice(["mean", "gust"])
    speed = draw.uniform(15, 36) * KN / (GUST[exposure] if kind == "mean" else 1)
    height = draw.uniform(4, 16)
    length = height * draw.uniform(2.5, 8)
    weight = draw.choice([10.0, 14.0, 18.8, 30.0])
    mass = draw.uniform(8, 40)
    ln15, sd, beta_mean, beta_sd, cov = draw.uniform(6.8, 9.9), draw.uniform(0.05, 0.4), draw.uniform(-0.08, 0.08), draw.uniform(0.03, 0.1), draw.uniform(-0.001, 0.001)
    exponent = draw.choice([0.92, 0.86, 0.8])
    sigma, s_u, s_w = draw.uniform(0.25, 0.45), draw.uniform(0.05, 0.25), draw.uniform(0.1, 0.3)
    x = math.log(mass / 15)
    mean = ln15 + (exponent + beta_mean) * x
    variance = sd * sd + 2 * x * cov + x * x * beta_sd * beta_sd
    half_rho = 0.5 * 1.225 * drag_area
    survey = lambda gust: half_rho * gust * gust
    most_shown15 = math.exp(ln15 + draw.uniform(-1.6, 0.6))
    most = most_shown15 * math.exp((exponent + beta_mean) * x)

    def chance(gust):
        load = survey(gust)
        a = angle(load, height, length, weight)
        spread = math.sqrt(variance + sigma**2 + s_u**2 + s_w**2 + TAU_F**2 + tau_r(a) ** 2)
        return NORMAL.cdf((mean + math.log(uplift(a)) - math.log(load)) / spread)

    def shown(gust):
        load = survey(gust)
        return gust == 0 or load / uplift(angle(load, height, length, weight)) <= most

    def table_met(speed_ms):
        load = TABLE_30KN_LBF * LBF * (speed_ms / (30 * KN)) ** 2
        return speed_ms == 0 or load <= math.exp(mean) * uplift(angle(load, height, length, weight))

    gust_now = speed * (GUST[exposure] if kind == "mean" else 1)
    by_chance = halve(lambda v: v == 0 or chance(v) >= 0.9, 64 * KN)
    by_cap = halve(shown, 64 * KN)
    reached = min(v for v in (by_chance, by_cap, math.inf) if v is not None)
    return {
        "plan": {"dragAreaM2": drag_area, "exposure": exposure, "kind": kind, "speedMs": speed, "heightM": height, "lengthM": length, "weightNPerM": weight},
        "massKg": mass,
        "fit": {"lnMean15Kg": ln15, "lnSd": sd, "betaMean": beta_mean, "betaSd": beta_sd, "betaCovariance": cov, "exponent": exponent, "sigma": sigma, "trial": s_u, "anchorDay": s_w, "mostShown15KgN": most_shown15},
        "surveyN": survey(gust_now),
        "upliftFactor": uplift(angle(survey(gust_now), height, length, weight)),
        "chance": chance(gust_now),
        "low90N": math.exp(mean + NORMAL.inv_cdf(0.05) * math.sqrt(variance)),
        "medianN": math.exp(mean),
        "gustMs": None if reached == math.inf else reached,
        "meanMs": None if reached == math.inf else reached / GUST[exposure],
        "atLeast": by_cap is not None and (by_chance is None or by_cap < by_chance),
        "tableWindMs": halve(table_met, 64 * KN),
    }


if __name__ == "__main__":
    draw = random.Random(20250301)
    print(json.dumps([one_case(draw) for _ in range(60)], indent=1))
