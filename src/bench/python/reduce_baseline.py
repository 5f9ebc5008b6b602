"""The same reduction as `crossreach reduce FOLDER --json`, straightforwardly with numpy and pandas.

Written for comparing speed only (Debian: python3-pandas): earth frame, bottom track, each pass's own
line, slant-mean depths, power laws with the exponent 1/6, no screens but the side-lobe limit. So the
program does the same work with its screens off, and more with its default screens: give both ratios.

    python3 src/bench/python/reduce_baseline.py FOLDER
"""

import hashlib
import json
import math
import sys
from pathlib import Path

import numpy as np
import pandas as pd

EXPONENT = 1 / 6


def filled(values, position):
    """Gaps linear in position, the nearest value at the ends."""
    good = ~np.isnan(values)
    return np.interp(position, position[good], values[good])


def reduce_pass(folder, entry, instrument):
    path = folder / entry["file"]
    digest = hashlib.sha256(path.read_bytes()).hexdigest()
    table = pd.read_csv(path)
    cells = sum(1 for name in table.columns if name.startswith("east_mps_"))
    east = table[[f"east_mps_{k + 1}" for k in range(cells)]].to_numpy()
    north = table[[f"north_mps_{k + 1}" for k in range(cells)]].to_numpy()
    time = pd.to_datetime(table["time"], utc=True)
    elapsed = (time - time.iloc[0]).dt.total_seconds().to_numpy()
    turn = math.radians(
        instrument.get("declination_deg", 0) + instrument.get("heading_offset_deg", 0)
    )
    cos, sin = math.cos(turn), math.sin(turn)
    boat_e, boat_n = table["bt_east_mps"].to_numpy(), table["bt_north_mps"].to_numpy()
    boat_e, boat_n = cos * boat_e + sin * boat_n, cos * boat_n - sin * boat_e
    boat_e, boat_n = filled(boat_e, elapsed), filled(boat_n, elapsed)
    east, north = cos * east + sin * north, cos * north - sin * east
    step = np.diff(elapsed, prepend=elapsed[0])
    move_e, move_n = boat_e * step, boat_n * step
    length = np.cumsum(np.hypot(move_e, move_n))
    beams = table[[f"depth_beam{b}_m" for b in (1, 2, 3, 4)]].to_numpy()
    draft = instrument["draft_m"]
    depth = filled(np.nanmean(beams, axis=1) + draft, length)
    shallow = filled(np.nanmin(beams, axis=1), elapsed)
    left = entry["start_bank"] == "left"
    line = np.array([move_e.sum(), move_n.sum()]) * (1 if left else -1)
    line /= np.hypot(*line)
    normal = (north + boat_n[:, None]) * line[0] - (east + boat_e[:, None]) * line[1]
    progress = (move_e * line[0] + move_n * line[1]) * (1 if left else -1)
    size = table["cell_size_m"].to_numpy()
    top = table["first_cell_m"].to_numpy() - size / 2
    lower_edge = top[:, None] + np.arange(1, cells + 1) * size[:, None]
    limit = shallow * math.cos(math.radians(instrument["beam_angle_deg"]))
    usable = (lower_edge <= limit[:, None]) & ~np.isnan(normal)
    usable &= np.arange(cells) < table["cells"].to_numpy()[:, None]
    lower = depth[:, None] - draft - lower_edge
    upper = lower + size[:, None]
    power = EXPONENT + 1
    raised_u, raised_l = np.maximum(upper, 0) ** power, np.maximum(lower, 0) ** power
    through = np.where(usable, normal * size[:, None], 0).sum(axis=1)
    divisor = np.where(usable, raised_u - raised_l, 0).sum(axis=1)
    own = usable.any(axis=1)
    first = usable.argmax(axis=1)
    last = cells - 1 - usable[:, ::-1].argmax(axis=1)
    row = np.arange(len(depth))
    # gaps between usable cells: linear in depth
    gaps = np.zeros(len(depth))
    inner = (np.arange(cells) > first[:, None]) & (np.arange(cells) < last[:, None]) & ~usable
    for i in np.nonzero(inner.any(axis=1) & own)[0]:
        good = np.nonzero(usable[i])[0]
        bad = np.nonzero(inner[i])[0]
        gaps[i] = np.interp(bad, good, normal[i, good]).sum() * size[i]
    with np.errstate(invalid="ignore", divide="ignore"):
        amplitude = through / divisor
        parts = np.array([
            amplitude * (depth**power - raised_u[row, first]),
            through + gaps,
            amplitude * raised_l[row, last],
        ])
    parts = np.array([filled(np.where(own, p, np.nan) / depth, length) * depth for p in parts])
    zones = (parts * progress).sum(axis=1)
    mean = parts.sum(axis=0) / depth
    wanted = 10
    good = np.nonzero(own)[0]
    edges = {}
    for side in ("left", "right"):
        at = good[:wanted] if (side == "left") == left else good[::-1][:wanted]
        edge = entry[f"{side}_edge"]
        coefficient = {"sloping": 0.3535, "wall": 0.91}.get(
            edge["shape"], edge.get("coefficient")
        )
        edges[side] = coefficient * mean[at].mean() * depth[at].mean() * edge["distance_m"]
    total = zones.sum() + edges["left"] + edges["right"]
    return {"name": path.name, "sha256": digest, "total": total, "zones": list(zones), **edges}


def main():
    folder = Path(sys.argv[1])
    measurement = json.loads((folder / "measurement.json").read_text())
    passes = [reduce_pass(folder, e, measurement["instrument"]) for e in measurement["passes"]]
    totals = np.array([p["total"] for p in passes])
    print(json.dumps({"passes": passes, "mean": totals.mean(), "sd": totals.std(ddof=1)}))


if __name__ == "__main__":
    main()
