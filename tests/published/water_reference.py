"""Writes reference values for the water models, computed with python3-iapws and python3-gsw.

Usage: water_reference.py OUTPUT
Each line: what,T/K,p/Pa,value,tolerance; SI units, the tolerance absolute. Random states, fixed seed.
"""
import inspect
import math
import random
import sys
import warnings

import gsw
from iapws import iapws95, iapws97
from iapws import _iapws as releases

warnings.filterwarnings("ignore")
draw = random.Random(20240607).uniform
rows = []


def add(what, T, p, value, tolerance):
    rows.append(f"{what},{T!r},{p!r},{float(value)!r},{float(tolerance)!r}\n")


def same(what, T, p, value, scale):
    """The same formulation: 1e-9 relative; `scale` stands in where the value passes through zero."""
    add(what, T, p, value, 1e-9 * max(abs(value), scale))


def properties(name, T, p, prop):
    same(name + ".entropy", T, p, prop["s"] * 1e3, 100.0)
    same(name + ".enthalpy", T, p, prop["h"] * 1e3, 1e4)
    same(name + ".heat_capacity", T, p, prop["cp"] * 1e3, 0.0)
    if "v" in prop:
        same(name + ".volume", T, p, prop["v"], 0.0)


def without_sound(function):
    """A region of iapws97 without its speed of sound, whose root fails in metastable states."""
    lines = [line for line in inspect.getsource(function).split("\n") if 'propiedades["w"]' not in line]
    scope = dict(iapws97.__dict__)
    exec("\n".join(lines), scope)
    return scope[function.__name__]


region1 = without_sound(iapws97._Region1)


def saturation(T):
    return iapws97._PSat_T(T) * 1e6


def r7():
    for _ in range(300):
        T = draw(273.15, 623.15)
        p = math.exp(draw(math.log(saturation(T)), math.log(100e6)))
        properties("region1", T, p, region1(T, p / 1e6))
        T = draw(273.15, 1073.15)
        top = saturation(T) if T < 623.15 else iapws97._P23_T(T) * 1e6 if T < 863.15 else 100e6
        p = math.exp(draw(math.log(100.0), math.log(top)))
        properties("region2", T, p, iapws97._Region2(T, p / 1e6))
        T = draw(1073.15, 2273.15)
        p = math.exp(draw(math.log(100.0), math.log(50e6)))
        properties("region5", T, p, iapws97._Region5(T, p / 1e6))
        T = draw(273.15, 647.0)
        add("saturation_pressure", T, 0.0, saturation(T), 1e-9 * saturation(T))
        p = saturation(T)
        add("saturation_temperature", iapws97._TSat_P(p / 1e6), p, iapws97._TSat_P(p / 1e6), 1e-9 * T)
    # region 3 by density, so that its solution for the density is tested too
    count = 0
    while count < 300:
        T = draw(623.2, 860.0)
        rho = draw(115.0, 760.0)
        prop = iapws97._Region3(rho, T)
        p = prop["P"] * 1e6
        if not iapws97._P23_T(T) * 1e6 < p < 100e6 or abs(T - 647.096) < 0.5:
            continue
        if T < 647.096 and not (rho > 322.0 and p > saturation(T) * 1.001):
            continue
        prop.pop("v")
        properties("region3", T, p, prop)
        count += 1
    count = 0
    while count < 100:
        T = draw(624.0, 646.0)
        liquid = count % 2 == 0
        rho = draw(380.0, 700.0) if liquid else draw(110.0, 300.0)
        prop = iapws97._Region3(rho, T)
        p = prop["P"] * 1e6
        stable = p > saturation(T) * 1.001 if liquid else iapws97._P23_T(T) * 1e6 < p < saturation(T) * 0.999
        if stable and prop["kt"] > 0:
            prop.pop("v")
            properties("region3_liquid" if liquid else "region3_vapour", T, p, prop)
            count += 1


def sr6():
    for _ in range(300):
        T = draw(253.151, 383.149)
        at = releases._Liquid(T)
        same("sr6.volume", T, 1e5, at["v"], 0.0)
        # the term of first order in pressure, put together here: the library's own mixes kJ and MJ
        for p in (1e5, draw(1e3, 3e5)):
            d = p - 1e5
            same("sr6.entropy", T, p, at["s"] * 1e3 - at["vt"] * d, 100.0)
            same("sr6.enthalpy", T, p, at["h"] * 1e3 + (at["v"] - T * at["vt"]) * d, 1e4)
            same("sr6.heat_capacity", T, p, at["cp"] * 1e3 - T * at["vtt"] * d, 0.0)


def ice():
    for _ in range(300):
        T = draw(1.0, 273.16)
        p = math.exp(draw(math.log(612.0), math.log(208e6)))
        prop = releases._Ice(T, p / 1e6)
        properties("ice", T, p, prop)
    for _ in range(300):
        # gsw: Celsius, and pressure in dbar above 101325 Pa
        t = draw(-100.0, 0.0)
        p_sea = draw(0.0, 1e4)
        T, p = t + 273.15, 101325.0 + p_sea * 1e4
        same("ice.entropy", T, p, gsw.entropy_ice(t, p_sea), 100.0)
        same("ice.enthalpy", T, p, gsw.enthalpy_ice(t, p_sea), 1e4)
        same("ice.heat_capacity", T, p, gsw.cp_ice(t, p_sea), 0.0)
        same("ice.volume", T, p, gsw.specvol_ice(t, p_sea), 0.0)
    for k in range(200):
        T = 251.2 + k * (273.159 - 251.2) / 199
        add("melting", T, releases._Melting_Pressure(T) * 1e6, T, 0.022)
    for k in range(100):
        T = 253.15 + k * 20.0 / 99
        add("sublimation", T, releases._Sublimation_Pressure(T) * 1e6, T, 0.0)


water95 = iapws95.IAPWS95(T=300.0, P=1.0)


def scientific(T, p, density):
    """IAPWS-95 by Newton steps from `density`, a start on the branch wanted."""
    def pressure(rho):
        return water95._Helmholtz(rho, T)["P"] * 1e3
    for _ in range(200):
        slope = (pressure(density + 1e-3) - pressure(density - 1e-3)) / 2e-3
        assert slope > 0.0
        step = (pressure(density) - p) / slope
        density -= step
        if abs(step) < 1e-10 * density:
            break
    a = water95._Helmholtz(density, T)
    mixed = (1 + a["delta"] * a["fird"]) * a["alfap"] * T
    stiffness = 1 + 2 * a["delta"] * a["fird"] + a["delta"] ** 2 * a["firdd"]
    return {"h": a["h"] * 1e3, "s": a["s"] * 1e3, "cp": (a["cv"] + water95.R * mixed ** 2 / stiffness) * 1e3}


def other_formulations():
    """IAPWS-95 and TEOS-10 stand against the models with the deviations that the headers state."""
    for k in range(14):
        T = 253.15 + 10.0 * k
        b = scientific(T, 1e5, 1000.0)
        add("sr6.entropy", T, 1e5, b["s"], 0.004)
        add("sr6.enthalpy", T, 1e5, b["h"], 1.1)
        add("sr6.heat_capacity", T, 1e5, b["cp"], 0.25)
    for p in (1.0, 1e4, 1e5, 1e6):
        for k in range(21):
            T = 373.15 + 10.0 * k
            b = scientific(T, p, 1000.0)
            add("liquid.entropy", T, p, b["s"], 0.52)
            add("liquid.enthalpy", T, p, b["h"], 290.0)
            add("liquid.heat_capacity", T, p, b["cp"], 0.0011 * b["cp"])
    for k in range(9):
        T = 273.15 + 5.0 * k
        t = T - 273.15
        # gsw: fresh water, at 0.1 MPa (slightly less than its zero of pressure), stated for -6 to 40 Celsius
        p_sea = (1e5 - 101325.0) / 1e4
        add("sr6.entropy", T, 1e5, gsw.entropy_from_t(0.0, t, p_sea), 0.06)
        add("sr6.heat_capacity", T, 1e5, gsw.cp_t_exact(0.0, t, p_sea), 0.6)


r7()
sr6()
ice()
other_formulations()
with open(sys.argv[1], "w", encoding="ascii") as output:
    output.writelines(rows)
