/** A script of our own with most of what front ends meet: small enough for every prefix of it to be parsed. */
export const script = `#!/usr/bin/env python
# -*- coding: utf-8 -*-
"""Settling tank, first sizing.

H : water depth [m]
"""
import math
import numpy as np
from .tanks import wall as w, floor

# given
g = 9.81       # [m/s^2]
Q = 0.35       # [m^3/s] mean flow
ρ, μ = 998., 1.0e-3  # 𝒳
sizes = [0.1,  # [mm] fine
         0.3]  # [mm] coarse
tank = {'width': 4.0,  # [m]
        'depth': 3.2}

def settle(d, ρ_s=2650.,  # [kg/m^3]
           *, ν=1e-6, **rest):
    """Velocity after Stokes.

    d : float
        grain size [m]
    """
    # (quartz)

    if d < 1e-4 and ρ_s > ρ:
        v = g*(ρ_s/ρ - 1)*d**2/(18*ν)  # [m/s]
    elif d > 1: return None
    else:
        v = math.sqrt(3.3*g*d*(ρ_s/ρ - 1)); k = f"{v:.3f} m/s"
    for i in range(3):
        v *= 1.0
    return v, [x**2 for x in sizes if x > 0]
    # end


class Tank:
    """A tank."""
    width: float = 4.0
    "clear width [m]"
    def area(self, length): return self.width*length

with open('log.txt') as out: out.write("x")
try:
    A = Q/settle(sizes[0]*1e-3)[0]
except (ZeroDivisionError, ValueError) as e:
    A = None
print(A if A else 'none', sep="")
x = 1
y = 2
x = 1
`;
