"""Makes exp-60-digits.json: e to the power x in 60-digit decimals (mpmath) at points that are exact doubles. Run: python3 test/reference/_makeExp60Digits.py

Each row holds x, the double nearest to e^x, and the rest e^x minus that double as a second double, so that a result can be
compared far below one unit in the last place. Points: random ones over the normal range (fixed seed), ones next to the
middles between table steps (k + 1/2) ln 2 / 128, where the polynomial is worst, small ones, and both ends of the range.
"""

import json
import math
import pathlib
import random
from mpmath import mp, mpf, exp

mp.dps = 60
random.seed(20240229)
points = [random.uniform(-40, 40) for _ in range(60)]
points += [random.uniform(-708, 709.7) for _ in range(60)]
points += [(random.randrange(-90000, 90000) + 0.5) * math.log(2) / 128 for _ in range(80)]
points += [s * 2.0**-e for e in (1, 2, 5, 8, 9, 20, 30, 52, 53, 54, 60, 1074) for s in (1, -1)]
points += [1.0, -1.0, 0.5, 2.0, 10.0, -10.0, 100.0, -100.0, 699.9999999999999, 700.0, 700.0000000000001, -699.9999999999999]
points += [-700.0, -700.0000000000001, 709.0, 709.782712893384, -708.0, -708.3964185322641]
rows = []
for x in points:
    value = exp(mpf(x))
    nearest = float(value)
    rows.append([x, nearest, float(value - mpf(nearest))])
text = ",\n    ".join(json.dumps(row) for row in rows)
pathlib.Path(__file__).with_name("exp-60-digits.json").write_text(
    '{\n  "source": "60-digit arithmetic; made by _makeExp60Digits.py",\n  "columns": ["x", "nearest_double", "rest"],\n  "rows": [\n    '
    + text + "\n  ]\n}\n"
)
