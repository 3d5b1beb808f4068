"""Makes planck-radiance.json: Planck's law in 40-digit arithmetic (mpmath) from the exact SI constants. Run: python3 test/reference/_makePlanckRadiance.py"""

import json
import pathlib
from mpmath import mp, mpf, expm1

mp.dps = 40
h, c, k = mpf("6.62607015e-34"), mpf(299792458), mpf("1.380649e-23")
points = [(300, 250), (300, 5772), (380, 2856), (500, 5772), (555, 1500), (700, 20000), (830, 50000), (1000, 300), (10000, 255), (1000000, 2.725), (1000000000, 100000000)]
rows = []
for wavelength, temperature in points:
    metres = mpf(wavelength) * mpf("1e-9")
    value = 2 * h * c**2 / metres**5 / expm1(h * c / (metres * k * mpf(temperature))) * mpf("1e-9")
    rows.append([wavelength, temperature, float(value)])
text = ",\n    ".join(json.dumps(row) for row in rows)
pathlib.Path(__file__).with_name("planck-radiance.json").write_text(
    '{\n  "source": "Planck\'s law in 40-digit arithmetic; made by _makePlanckRadiance.py",\n'
    '  "columns": ["wavelength_nm", "temperature_K", "radiance_W_m2_sr_nm"],\n  "rows": [\n    ' + text + "\n  ]\n}\n"
)
