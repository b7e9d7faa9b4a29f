"""Reference values of tests/e2e/whole-job.spec.ts, worked out with Python's standard library alone.

Nothing here reads the project. Run `python3 tests/reference/whole-job.py > tests/reference/whole-job.json` and commit both.
Ways taken are plain ones on purpose: Gauss-Newton for the tape, trying every triple of limits for the fit, every place on a
1/16 in grid for joints and added anchors, every way of sharing pieces out for the boards.
"""
import json
import math
from fractions import Fraction as F
from itertools import combinations, product

# --- The invented job: an L of 30 by 24 ft, poured a little out of square. True corners, inches; no tape sees them.
TRUE = [(0, 0), (360.25, 0), (360.75, 168.125), (228.5, 167.875), (228.875, 288.25), (0.5, 288.375)]
NAMES = "ABCDEF"
PULLS = ["AB", "BC", "CD", "DE", "EF", "FA", "AC", "AD", "AE", "BF"]  # one more than the nine that six corners need
BURN = 1
INSET = 7 / 16
# Chalk wanted, corner to corner: 30 by 24 ft less two insets; the leg of 11 by 10 ft keeps its sides at the inside corner.
CHALK = {"ab": F(2873, 8), "bc": F(1337, 8), "cd": F(132), "de": F(120), "ef": F(1817, 8), "fa": F(2297, 8)}
STEP = F(1, 16)


def sixteenths(value):
    """Nearest 1/16, ties to the even one, and what the rounding hides."""
    scaled = F(value) * 16 if not isinstance(value, float) else value * 16
    count = round(scaled)  # Python rounds ties to even
    lean = "exact" if abs(float(scaled) - count) < 1e-9 else "strong" if float(scaled) > count else "scant"
    return F(count, 16), lean


def fraction(value):
    whole, rest = divmod(value, 1)
    return f"{whole} {rest}" if whole and rest else f"{rest}" if rest else f"{whole}"


def inches(value):
    """As a tape that counts inches shows it."""
    rounded, _ = sixteenths(value)
    return ("-" if rounded < 0 else "") + fraction(abs(rounded))


def feet(value):
    rounded, _ = sixteenths(value)
    sign, rounded = ("-" if rounded < 0 else ""), abs(rounded)
    ft, rest = divmod(rounded, 12)
    return sign + (f"{ft}' " if ft else "") + fraction(rest) + '"'


# --- 1. The tape on concrete, to the nearest 1/16, burned an inch; corners back from it by least squares.
def distance(p, q):
    return math.hypot(p[0] - q[0], p[1] - q[1])


def pull(name, corners):
    return distance(corners[NAMES.index(name[0])], corners[NAMES.index(name[1])])


readings = {name: sixteenths(pull(name, TRUE))[0] + BURN for name in PULLS}


def solve(matrix, right):
    n = len(right)
    rows = [list(row) + [value] for row, value in zip(matrix, right)]
    for column in range(n):
        pivot = max(range(column, n), key=lambda row: abs(rows[row][column]))
        rows[column], rows[pivot] = rows[pivot], rows[column]
        for row in range(n):
            if row != column:
                times = rows[row][column] / rows[column][column]
                rows[row] = [a - times * b for a, b in zip(rows[row], rows[column])]
    return [rows[i][n] / rows[i][i] for i in range(n)]


def adjusted():
    """A at 0, 0; B on the x axis: nine unknowns."""
    place = [c for i, p in enumerate(TRUE) for c in (p if i > 1 else (p[0],) if i == 1 else ())]
    corners = lambda u: [(0, 0), (u[0], 0)] + [(u[i], u[i + 1]) for i in range(1, 9, 2)]
    for _ in range(30):
        residual = [float(readings[name] - BURN) - pull(name, corners(place)) for name in PULLS]
        jacobian = []
        for name in PULLS:
            row = []
            for i in range(9):
                ahead, back = list(place), list(place)
                ahead[i] += 1e-4
                back[i] -= 1e-4
                row.append((pull(name, corners(ahead)) - pull(name, corners(back))) / 2e-4)
            jacobian.append(row)
        normal = [[sum(r[i] * r[j] for r in jacobian) for j in range(9)] for i in range(9)]
        change = solve(normal, [sum(r[i] * e for r, e in zip(jacobian, residual)) for i in range(9)])
        place = [a + b for a, b in zip(place, change)]
        if max(map(abs, change)) < 1e-11:
            break
    return corners(place)


slab = adjusted()

# --- 2. The wanted L moved as one piece so that the worst departure from the inset is least.
plan = [(0.0, 0.0)]
for wall, (dx, dy) in zip(CHALK, [(1, 0), (0, 1), (-1, 0), (0, 1), (-1, 0)]):
    plan.append((plan[-1][0] + dx * float(CHALK[wall]), plan[-1][1] + dy * float(CHALK[wall])))
edges = []
for i in range(6):
    (x0, y0), (x1, y1) = slab[i], slab[(i + 1) % 6]
    long = math.hypot(x1 - x0, y1 - y0)
    edges.append(((x0, y0), (-(y1 - y0) / long, (x1 - x0) / long)))  # inward of a plan that runs counter-clockwise
PLACES = [(side, corner) for side in range(6) for corner in (side, (side + 1) % 6)]


def turned(angle):
    c, s = math.cos(angle), math.sin(angle)
    return [(c * x - s * y, s * x + c * y) for x, y in plan]


def departures(angle):
    """Of each place: (a, b, c) with departure = a*dx + b*dy + c."""
    at = turned(angle)
    return [(n[0], n[1], n[0] * (at[k][0] - p[0]) + n[1] * (at[k][1] - p[1]) - INSET) for side, k in PLACES for p, n in [edges[side]]]


def least_worst(angle):
    """The least worst departure at an angle, by every three limits that can hold it (slide and worst: three unknowns)."""
    limits = [(sign * a, sign * b, sign * c) for a, b, c in departures(angle) for sign in (1, -1)]
    best = None
    for trio in combinations(limits, 3):
        try:
            dx, dy, worst = solve([[a, b, -1.0] for a, b, _ in trio], [-c for _, _, c in trio])
        except ZeroDivisionError:
            continue
        if (best is None or worst < best[0]) and all(a * dx + b * dy + c <= worst + 1e-9 for a, b, c in limits):
            best = (worst, dx, dy)
    return best


def fit():
    low, high = -0.02, 0.02
    coarse = [low + (high - low) * i / 80 for i in range(81)]
    start = min(coarse, key=lambda angle: least_worst(angle)[0])
    low, high = start - 0.0005, start + 0.0005
    golden = (math.sqrt(5) - 1) / 2
    for _ in range(45):
        a, b = high - golden * (high - low), low + golden * (high - low)
        if least_worst(a)[0] < least_worst(b)[0]:
            high = b
        else:
            low = a
    angle = (low + high) / 2
    worst, dx, dy = least_worst(angle)
    found = [a * dx + b * dy + c for a, b, c in departures(angle)]
    holding = [i for i, d in enumerate(found) if abs(abs(d) - worst) < 1e-6]
    assert len(holding) >= 4, "the pose must be held by four places, or the others would not be settled by it"
    return worst, {place: d + INSET for place, d in zip(PLACES, found)}


worst, offset = fit()
assert min(offset.values()) > 0, "no chalk line may hang over"
offsets = {}
for corner in range(6):
    offsets[NAMES[corner]] = {}
    for side in sorted({(corner - 1) % 6, corner}):
        value, lean = sixteenths(offset[(side, corner)])
        assert abs(offset[(side, corner)] * 16 % 1 - 0.5) > 1e-3, "too near a tie to be told from outside"
        offsets[NAMES[corner]][list(CHALK)[side]] = feet(value) + ("" if lean == "exact" else f" {lean}")

# What the tape must read on the chalk between any two corners, burn included.
chalk_pulls = {a + b: inches(pull(a + b, plan) + BURN) for a, b in combinations(NAMES, 2)}

# --- 3. Bolts as poured, from the chalk: station, then offset.
BOLTS = {
    "ab": ["8, 2 3/4", "74, 2 5/8", "141, 2 3/4", "205, 2 3/4", "272, 2 7/8", "342, 2 3/4"],
    "bc": ["9, 2 3/4", "78, 2 3/4", "150, 2 3/4"],
    "cd": ["10, 2 3/4", "72, 2 3/4", "123, 2 3/4"],
    "de": ["4, 2 3/4", "52, 2 3/4", "98, 2 3/4"],
    "ef": ["8, 2 3/4", "78, 2 3/4", "140, 2 3/4", "212, 2 3/4"],
    "fa": ["8, 2 3/4", "74, 2 3/4", "136, 2 3/4", "152, 2 3/4", "212, 2 3/4", "272, 2 3/4"],
}
station = {wall: [F(line.split(",")[0]) for line in lines] for wall, lines in BOLTS.items()}
across = {wall: [sum(map(F, line.split(",")[1].split())) for line in lines] for wall, lines in BOLTS.items()}

# --- 4. Plates. The one that runs through at each corner; D points inward, so DE goes a plate's width past it.
WIDTH = F(11, 2)
THROUGH = {"A": "ab", "B": "bc", "C": "cd", "D": "de", "E": "ef", "F": "fa"}
SPACING, END_LEAST, END_MOST = F(72), F(7, 2), F(12)  # IRC R403.1.6: 6 ft, seven diameters of 1/2 in, 12 in; two to a piece
SHORTEST, KERF, STOCK = F(24), F(1, 8), [F(192), F(264)]
spans = {}
for wall, long in CHALK.items():
    first, last = wall.upper()
    end = lambda corner: (-WIDTH if corner == "D" else 0) if THROUGH[corner] == wall else (0 if corner == "D" else WIDTH)
    spans[wall] = (F(end(first)), long - end(last))


def added_needed(start, end, bolts):
    """Fewest added anchors for one piece, by the gaps alone: an end further than 12 in takes one, a gap as many as it lacks."""
    own = sorted(b for b in bolts if start < b < end)
    if any(b - start < END_LEAST or end - b < END_LEAST for b in own):
        return None
    count = 0
    if not own or own[0] - start > END_MOST:
        own, count = [start + 8] + own, count + 1
    if end - own[-1] > END_MOST:
        own, count = own + [end - 8], count + 1
    for a, b in zip(list(own), own[1:]):
        count += max(0, math.ceil((b - a) / SPACING) - 1)
    assert len(own) >= 2
    return count


def joints_of(wall):
    """Fewest added anchors with the fewest pieces the stock allows, and every joint on the 1/16 that keeps to it."""
    start, end = spans[wall]
    if end - start <= max(STOCK):
        whole = added_needed(start, end, station[wall])
        # One piece; a joint could only be wanted if it saved anchors, and it never takes one away.
        return whole, None
    found = {}
    place = start + SHORTEST
    while place <= end - SHORTEST:
        if place - start <= max(STOCK) and end - place <= max(STOCK):
            both = [added_needed(start, place, station[wall]), added_needed(place, end, station[wall])]
            if None not in both:
                found.setdefault(sum(both), []).append(place)
        place += STEP
    least = min(found)
    windows = []
    for place in found[least]:
        if windows and place - windows[-1][1] == STEP:
            windows[-1][1] = place
        else:
            windows.append([place, place])
    return least, windows


added, windows = {}, {}
for wall in CHALK:
    added[wall], windows[wall] = joints_of(wall)

# --- 5. Boards: every way to share the pieces out, cheapest first, joints free in their windows.
fixed = [spans[w][1] - spans[w][0] for w in CHALK if windows[w] is None]
split = [w for w in CHALK if windows[w] is not None]
assert len(split) == 2


def fits(groups, boards, box):
    """Whether joints (x, y) in a box let every group of pieces fit its board: limits u*x + v*y <= c, tried at their meetings."""
    limits = [(F(1), F(0), box[0][1]), (F(-1), F(0), -box[0][0]), (F(0), F(1), box[1][1]), (F(0), F(-1), -box[1][0])]
    for group, board in zip(groups, boards):
        u = sum(p[0] for p in group)
        v = sum(p[1] for p in group)
        limits.append((F(u), F(v), board - (len(group) - 1) * KERF - sum(p[2] for p in group)))
    for (a, b, c), (d, e, f) in combinations(limits, 2):
        det = a * e - b * d
        if det == 0:
            continue
        x, y = (c * e - b * f) / det, (a * f - c * d) / det
        if all(u * x + v * y <= w for u, v, w in limits):
            return True
    return False


def shares(pieces, count):
    """Every way of putting pieces into exactly so many groups."""
    def go(index, groups):
        if len(groups) > count or len(groups) + len(pieces) - index < count:
            return
        if index == len(pieces):
            yield groups
            return
        for i in range(len(groups)):
            yield from go(index + 1, groups[:i] + [groups[i] + [pieces[index]]] + groups[i + 1:])
        yield from go(index + 1, groups + [[pieces[index]]])
    yield from go(0, [])


def cheapest():
    pieces = [(F(0), F(0), long) for long in fixed]
    for axis, wall in enumerate(split):
        start, end = spans[wall]
        unit = (F(1), F(0)) if axis == 0 else (F(0), F(1))
        pieces.append((*unit, -start))
        pieces.append((-unit[0], -unit[1], end))
    total = sum(spans[w][1] - spans[w][0] for w in CHALK)
    best = None
    for count in range(1, len(pieces) + 1):
        for groups in shares(pieces, count):
            # No board takes a group whose fixed pieces alone are too long.
            for boards in product(STOCK, repeat=count):
                cost = sum(boards)
                if cost < total or (best is not None and (cost, count) >= best[:2]):
                    continue
                if any(sum(max(p[2], F(0)) for p in g if p[0] == p[1] == 0) > b for g, b in zip(groups, boards)):
                    continue
                if any(fits(groups, boards, box) for box in product(windows[split[0]], windows[split[1]])):
                    best = (cost, count, sorted(map(int, boards)))
    return best


cost, count, boards = cheapest()

# --- 6. Takeoff: no waste asked. Customary packages, as the page says them: 50 ft rolls, 280 ml cartridges, quarts for 25 sq ft two coats.
plate_length = sum(spans[w][1] - spans[w][0] for w in CHALK)
standing = sum(map(len, BOLTS.values()))
new = sum(added.values())
pieces = len(fixed) + 2 * len(split)
resin = new * math.pi / 4 * (0.625**2 - 0.5**2) * 7 * 16.387064
square_feet = (2 * pieces * 5.5 * 1.5 + (standing + new) * math.pi * 0.5625 * 1.5) / 144
takeoff = {
    "boards": {str(b): boards.count(b) for b in sorted(set(boards))},
    "rolls": math.ceil(plate_length / 600),
    "rods": new,
    "nuts": standing + new,
    "washers": standing + new,
    "cartridges": math.ceil(resin / 280),
    "cans": math.ceil(square_feet / 100 * 2 * 3785.411784 / 946),
}

# --- 7. Joists at 16 in on AB: near edges, half a joist before each sixteenth inch of the tape; the last flush with the end.
marks = []
while 16 * (len(marks) + 1) - F(3, 4) + F(3, 2) <= CHALK["ab"] - F(3, 2):
    marks.append(16 * (len(marks) + 1) - F(3, 4))
hit = [[i, k] for i, mark in enumerate(marks) for k, s in enumerate(station["ab"]) if mark - F(11, 16) < s < mark + F(3, 2) + F(11, 16)]

print(json.dumps({
    "pulls": {name: fraction(value) for name, value in readings.items()},
    "walk": ", ".join(f"{toward} {fraction(long)} in" for toward, long in zip("ENWNWS", CHALK.values())),
    "worst": feet(worst),
    "offsets": offsets,
    "lines": {wall: feet(long) for wall, long in CHALK.items()},
    "chalkPulls": chalk_pulls,
    "bolts": BOLTS,
    "stations": {wall: [float(s) for s in list_] for wall, list_ in station.items()},
    "across": {wall: [float(s) for s in list_] for wall, list_ in across.items()},
    "spans": {wall: [float(a), float(b)] for wall, (a, b) in spans.items()},
    "added": added,
    "windows": {wall: None if w is None else [[float(a), float(b)] for a, b in w] for wall, w in windows.items()},
    "rule": {"spacing": 72, "endLeast": 3.5, "endMost": 12},
    "boards": boards,
    "plateLength": float(plate_length),
    "takeoff": takeoff,
    "marks": [inches(mark) for mark in marks],
    "hits": hit,
}, indent=2))
