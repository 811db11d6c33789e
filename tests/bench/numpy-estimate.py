"""The estimate of a lot in vectorised NumPy: the same model and outputs, draws from default_rng, float64, numpy.quantile.

Reads from standard input one JSON object {draws, driverDraws, probabilities, beads, bins, plan, afterPlans} and then, for
each line, runs once with that seed and answers with the time it took and a few of its results. Plans arrive ready: the
evidence of the lot is weighed by the caller, which this side is not charged for.
"""
import json
import sys
import time

import numpy as np


def line_drawer(draws, rng, columns):
    """Draws a line's gold, mass and components; figures already drawn are found in columns."""

    def column(factor):
        quantity = factor["quantity"]
        kind = quantity["kind"]
        key = factor["key"] if kind == "lognormal" else (factor["key"], *quantity.values())
        if key not in columns:
            if kind == "lognormal":
                columns[key] = rng.standard_normal(draws)
            elif kind == "uniform":
                columns[key] = rng.uniform(quantity["lo"], quantity["hi"], draws)
            elif kind == "normal":
                columns[key] = np.maximum(rng.normal(quantity["mean"], quantity["sd"], draws), 0)
            else:
                columns[key] = rng.triangular(quantity["lo"], quantity["mode"], quantity["hi"], draws)
        return columns[key]

    def draw_term(term):
        log_sum, product = None, None
        constant = term["constant"]
        for factor in term["factors"]:
            values, power, quantity = column(factor), factor["power"], factor["quantity"]
            if quantity["kind"] == "lognormal":
                constant *= quantity["median"] ** power
                scaled = values * (np.log(quantity["gsd"]) * power)
                log_sum = scaled if log_sum is None else np.add(log_sum, scaled, out=log_sum)
            else:
                raised = values if power == 1 else values**power
                product = raised.copy() if product is None else np.multiply(product, raised, out=product)
        if log_sum is None and product is None:
            return np.full(draws, constant)
        if log_sum is None:
            return np.multiply(product, constant, out=product)
        np.exp(log_sum, out=log_sum)
        np.multiply(log_sum, constant, out=log_sum)
        return log_sum if product is None else np.multiply(log_sum, product, out=log_sum)

    def draw_line(line, with_mass):
        components = [draw_term(term) for term in line["gold"]]
        gold = components[0] if len(components) == 1 else np.sum(components, axis=0)
        return gold, draw_term(line["mass"]) if with_mass else None, components

    return draw_line


def ranges_after(given, rng):
    """p10 and p90 after each measurement over those of now, from a small sample; unchanged lines are drawn once."""
    draws = given["driverDraws"]
    draw_line = line_drawer(draws, rng, {})
    kept = [draw_line(line, False)[0] for line in given["plan"]["lines"]]
    now = np.quantile(np.sum(kept, axis=0), [0.1, 0.9])
    after = []
    for lines in given["afterPlans"]:
        parts = [kept[i] if line is None else draw_line(line, False)[0] for i, line in enumerate(lines)]
        after.append(np.quantile(np.sum(parts, axis=0), [0.1, 0.9]) / now)
    return after


def density(gold, quantiles, sd, bins):
    low, high = quantiles[0], quantiles[-1]
    counts, _ = np.histogram(gold, bins=bins, range=(low, high))
    width = (high - low) / bins
    spread = min(sd, (quantiles[6] - quantiles[4]) / 1.34)
    bandwidth = 0.9 * spread * len(gold) ** -0.2 / width
    reach = min(bins - 1, int(np.ceil(3 * bandwidth)))
    kernel = np.exp(-((np.arange(-reach, reach + 1) / bandwidth) ** 2) / 2)
    padded = np.pad(counts, reach, mode="symmetric")
    return np.convolve(padded, kernel / kernel.sum(), mode="valid") / (len(gold) * width)


def estimate(given, seed):
    draws, probabilities, beads = given["draws"], given["probabilities"], given["beads"]
    rng = np.random.default_rng(seed)
    columns = {}
    draw_line = line_drawer(draws, rng, columns)
    lines = [draw_line(line, True) for line in given["plan"]["lines"]]
    gold = np.sum([line_gold for line_gold, _, _ in lines], axis=0)
    mass = np.sum([line_mass for _, line_mass, _ in lines], axis=0)

    def spread(values):
        return values.mean(), values.std(ddof=1), np.quantile(values, probabilities)

    found = np.quantile(gold, given["goldProbabilities"])
    quantiles = found[: len(probabilities)]
    mean, sd = gold.mean(), gold.std(ddof=1)
    grades = np.quantile(gold / mass * 1e6, probabilities)
    variance, centred = sd * sd, gold - mean
    line_results = []
    for line_gold, line_mass, components in lines:
        of_line = spread(line_gold)
        line_results.append(
            (
                np.quantile(line_mass, 0.5),
                of_line,
                np.quantile(line_gold / line_mass * 1e6, probabilities),
                np.dot(line_gold - of_line[0], centred) / (draws - 1) / variance,
                [of_line] if len(components) == 1 else [spread(values) for values in components],
            )
        )
    # First-order shares by squared correlation with each figure.
    shares = {key: np.dot(values - values.mean(), centred) ** 2 / (np.var(values) * draws * draws * variance) for key, values in columns.items()}
    return {
        "mean": mean,
        "sd": sd,
        "quantiles": quantiles,
        "beads": found[len(probabilities) :],
        "grades": grades,
        "mass": np.quantile(mass, 0.5),
        "density": density(gold, quantiles, sd, given["bins"]),
        "lines": line_results,
        "shares": sorted(shares.values(), reverse=True),
        "after": ranges_after(given, rng),
    }


def main():
    given = json.loads(sys.stdin.readline())
    given["goldProbabilities"] = given["probabilities"] + given["beads"]
    print(json.dumps({"numpy": np.__version__}), flush=True)
    for text in sys.stdin:
        start = time.perf_counter()
        result = estimate(given, int(text))
        elapsed = time.perf_counter() - start
        answer = {"ms": elapsed * 1000, "mean": result["mean"], "p10": result["quantiles"][3], "p50": result["quantiles"][5], "p90": result["quantiles"][7]}
        print(json.dumps(answer), flush=True)


main()
