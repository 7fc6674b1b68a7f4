"""Conversion of developed laminar pipe flow with diffusion across and a first-order reaction.

2 (1 - r^2) dc/dz = Fo (1/r) d(r dc/dr)/dr - Da c on 0 < r < 1, dc/dr = 0 at both ends, c = 1 at z = 0; finite volumes in r, implicit
steps in z that grow with the distance. Writes radial-reaction.json beside it. Needs numpy and scipy.
"""
import json
from pathlib import Path

import numpy as np
from scipy.linalg import solve_banded


def conversion(damkohler: float, fourier: float, radial: int = 300, along: int = 6000) -> float:
    dr = 1 / radial
    r = (np.arange(radial) + 0.5) * dr
    face = fourier * np.arange(1, radial)
    volume, speed = r * dr, 2 * (1 - r**2)
    diagonal = np.zeros(radial)
    diagonal[:-1] += face
    diagonal[1:] += face
    z = np.linspace(0, 1, along + 1) ** 2
    c = np.ones(radial)
    for dz in np.diff(z):
        band = np.zeros((3, radial))
        band[0, 1:] = -face
        band[1] = volume * speed / dz + diagonal + volume * damkohler
        band[2, :-1] = -face
        c = solve_banded((1, 1), band, volume * speed / dz * c)
    return float(1 - 2 * np.sum(speed * c * volume))


rows = [{"damkohler": da, "fourier": fo, "conversion": round(conversion(da, fo), 5)} for da in (0.1, 0.3, 1.052, 3, 5) for fo in (1e-3, 0.01, 0.04, 0.1, 0.3, 1, 3)]
Path(__file__).with_suffix(".json").write_text(json.dumps({"source": "finite volumes, radial-reaction.py", "rows": rows}, indent=1) + "\n")
