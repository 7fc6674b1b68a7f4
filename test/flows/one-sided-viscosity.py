"""Developed laminar flow between plates, viscosity exponential in temperature, uniform flux: writes one-sided-viscosity.json.

Momentum: tau = tau_0 - G y, u' = tau/mu, no slip at both walls. Energy: theta'' in proportion to u, flux through one wall
or both. mu = mu_b r^((theta - theta_b)/(theta_w - theta_b)), iterated until the profiles agree.
f is over that of constant viscosity, 96/Re on twice the gap; heated and other are the shears of the walls over that same.
"""
import json
import math
from pathlib import Path

N = 2000


def solve(r, walls):
    h = 1 / N
    y = [(i + 0.5) * h for i in range(N)]
    u = [6 * t * (1 - t) for t in y]
    for _ in range(60):
        mean = sum(u) * h
        flux = [1.0]
        for i in range(N):
            flux.append(flux[-1] - walls * u[i] / mean * h)
        theta = [-h / 2]
        for i in range(1, N):
            theta.append(theta[-1] - flux[i] * h)
        bulk = sum(a * b for a, b in zip(theta, u)) / sum(u)
        mu = [r ** ((t - bulk) / -bulk) for t in theta]
        start = sum(t / m for t, m in zip(y, mu)) / sum(1 / m for m in mu)
        new, at = [], 0.0
        for t, m in zip(y, mu):
            step = (start - t) / m * h
            new.append(at + step / 2)
            at += step
        mean = sum(new) * h
        u = [v / mean for v in new]
    f = 1 / mean / 12
    return {"walls": walls, "wallOverBulk": r, "f": round(f, 4), "heated": round(2 * f * start, 4), "other": round(2 * f * (1 - start), 4)}


rows = [solve(r, walls) for walls in (1, 2) for r in (0.5, 0.7, 0.9, 1.1, 1.5, 2, 3)]
Path(__file__).with_suffix(".json").write_text("[\n" + ",\n".join(" " + json.dumps(row) for row in rows) + "\n]\n")
