"""Nanoseconds per state of the general-purpose library python3-iapws (Debian), a CSV line each; best of five rounds, which favours the library."""
import time

from iapws.iapws97 import _Backward2_T_Ph, _Backward2_T_Ps, _Backward3_v_PT, _Region1, _Region2, _Region3, _TSat_P


def time_of(call, count):
    best = float("inf")
    for _ in range(5):
        start = time.perf_counter()
        for _ in range(count):
            call()
        best = min(best, (time.perf_counter() - start) / count)
    return best * 1e9


for name, call in (
    ("Region1Full", lambda: _Region1(350, 5)),
    ("Region2Full", lambda: _Region2(600, 2)),
    ("Region3FullByDensity", lambda: _Region3(500, 650)),
    ("Region3Full", lambda: _Region3(1 / _Backward3_v_PT(30, 650), 650)),
    ("Region2FromPH", lambda: _Region2(_Backward2_T_Ph(2, 3000), 2)),
    ("Region2FromPS", lambda: _Region2(_Backward2_T_Ps(2, 6.8), 2)),
    ("SaturationTemperature", lambda: _TSat_P(2)),
):
    print(f"{name},{time_of(call, 2000):.0f}", flush=True)
