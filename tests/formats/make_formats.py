"""Writes the small workbook and netCDF files that the format tests read.

The water is invented. Run with Debian's python3 (python3-netcdf4, python3-openpyxl):  python3 make_formats.py
"""
import datetime as dt
import os

import netCDF4 as nc
import numpy as np
import openpyxl

HERE = os.path.dirname(os.path.abspath(__file__))
DEPTH = np.array([0.5, 1.0, 2.0, 4.0, 8.0])
TEMP = np.array([18.25, 18.125, 17.5, 14.75, 12.0625])
SALT = np.array([2.5, 3.25, 10.0, 24.5, 30.125])


def path(name):
    return os.path.join(HERE, name)


def variable(ds, name, kind, dims, standard_name, units, values=None, **attributes):
    fill = attributes.pop("fill", None)
    v = ds.createVariable(name, kind, dims, fill_value=fill) if fill is not None else ds.createVariable(name, kind, dims)
    if standard_name:
        v.standard_name = standard_name
    if units:
        v.units = units
    for key, value in attributes.items():
        setattr(v, key, value)
    if values is not None:
        v[:] = values
    return v


# One profile on one dimension, netCDF classic, double precision.
with nc.Dataset(path("single-profile-classic.nc"), "w", format="NETCDF3_CLASSIC") as ds:
    ds.Conventions = "CF-1.11"
    ds.featureType = "profile"
    ds.createDimension("z", 5)
    variable(ds, "depth", "f8", ("z",), "depth", "m", DEPTH, positive="down")
    variable(ds, "temp", "f8", ("z",), "sea_water_temperature", "degree_Celsius", TEMP)
    variable(ds, "psal", "f8", ("z",), "sea_water_practical_salinity", "1", SALT)
    variable(ds, "lat", "f8", (), "latitude", "degrees_north", 51.5)
    variable(ds, "lon", "f8", (), "longitude", "degrees_east", -29.25)
    variable(ds, "time", "f8", (), "time", "days since 1950-01-01 00:00:00", 27895.5)

# Three profiles of unequal length on a grid, netCDF-4, packed, with a record dimension and character names.
with nc.Dataset(path("profile-grid-netcdf4.nc"), "w", format="NETCDF4") as ds:
    ds.Conventions = "CF-1.11"
    ds.featureType = "profile"
    ds.createDimension("profile", None)
    ds.createDimension("z", 5)
    ds.createDimension("letters", 4)
    names = nc.stringtochar(np.array(["A", "B", "C"], dtype="S4"))
    variable(ds, "station", "S1", ("profile", "letters"), None, None, names, cf_role="profile_id")
    p = np.tile(np.array([0.5, 1, 2, 4, 8.0]), (3, 1))
    t = np.tile(TEMP, (3, 1)) + np.array([[0.0], [0.5], [1.0]])
    c = np.tile(np.array([4.0, 5.0, 15.0, 32.0, 38.0]), (3, 1))
    p[2, 3:] = t[2, 3:] = c[2, 3:] = -99
    variable(ds, "pres", "f8", ("profile", "z"), "sea_water_pressure_due_to_sea_water", "dbar", np.ma.masked_equal(p, -99), fill=-99.0)
    packed = variable(ds, "temp", "i2", ("profile", "z"), "sea_water_temperature", "degree_C", None, fill=np.int16(-32767),
                      scale_factor=0.0625, add_offset=10.0)
    packed[:] = np.ma.masked_less(t, -90)
    variable(ds, "cndc", "f4", ("profile", "z"), "sea_water_electrical_conductivity", "mS cm-1", np.ma.masked_equal(c, -99), fill=np.float32(-99))
    variable(ds, "lat", "f8", ("profile",), "latitude", "degrees_north", [51.0, 51.25, 51.5])
    variable(ds, "lon", "f8", ("profile",), "longitude", "degrees_east", [-29.0, -29.25, -29.5])
    variable(ds, "time", "f8", ("profile",), "time", "seconds since 1970-01-01T00:00:00Z", [1.7e9, 1.7e9 + 3600, 1.7e9 + 7200])

# Two profiles as a contiguous ragged array, 64-bit offset.
with nc.Dataset(path("ragged-profiles-64bit.nc"), "w", format="NETCDF3_64BIT_OFFSET") as ds:
    ds.Conventions = "CF-1.11"
    ds.featureType = "profile"
    ds.createDimension("cast", 2)
    ds.createDimension("obs", 7)
    variable(ds, "profile", "i4", ("cast",), None, None, [11, 12], cf_role="profile_id")
    variable(ds, "row_size", "i4", ("cast",), None, None, [4, 3], sample_dimension="obs")
    variable(ds, "lat", "f8", ("cast",), "latitude", "degrees_north", [51.0, 52.0])
    variable(ds, "time", "f8", ("cast",), "time", "hours since 2026-05-17 06:00", [0.0, 1.5])
    variable(ds, "depth", "f8", ("obs",), "depth", "m", [1, 2, 3, 4, 1, 2, 3])
    variable(ds, "temp", "f8", ("obs",), "sea_water_temperature", "K", np.array([15, 14, 13, 12, 16, 15, 14]) + 273.15)
    variable(ds, "psal", "f8", ("obs",), "sea_water_salinity", "1e-3", [5, 10, 20, 25, 3, 6, 9])

# A trajectory profile: indexed ragged, netCDF-4 with compression.
with nc.Dataset(path("indexed-profiles-netcdf4.nc"), "w", format="NETCDF4") as ds:
    ds.Conventions = "CF-1.11"
    ds.featureType = "trajectoryProfile"
    ds.createDimension("profile", 2)
    ds.createDimension("obs", 6)
    index = ds.createVariable("which", "i4", ("obs",), zlib=True)
    index.instance_dimension = "profile"
    index[:] = [0, 0, 0, 1, 1, 1]
    number = ds.createVariable("number", "i8", ("profile",))
    number.cf_role = "profile_id"
    number[:] = [1, 2]
    variable(ds, "lat", "f8", ("profile",), "latitude", "degrees_north", [51.0, 51.1])
    variable(ds, "lon", "f8", ("profile",), "longitude", "degrees_east", [-29.0, -29.1])
    variable(ds, "depth", "f8", ("obs",), "depth", "m", [0.5, 1, 1.5, 0.5, 1, 1.5])
    variable(ds, "temp", "f8", ("obs",), "sea_water_temperature", "degC", [10, 10.5, 11, 9, 9.5, 10])

# A workbook: a cover sheet, a sheet of casts under a preamble, a second sheet of casts.
book = openpyxl.Workbook()
cover = book.active
cover.title = "About"
cover["A1"] = "Invented water, for tests"
sheet = book.create_sheet("May")
sheet.append(["Survey of 17 May 2026"])
sheet.append([])
sheet.append(["Station", "Date", "Depth (m)", "Temperature (degC)", "Salinity (PSU)"])
for station, shift in (("Quay", 0.0), ("Mouth", 0.5)):
    for z, t_, s in zip(DEPTH, TEMP, SALT):
        sheet.append([station, dt.datetime(2026, 5, 17, 9, 30), float(z), float(t_ + shift), float(s)])
second = book.create_sheet("June")
second.append(["Depth", "Temp", "SpCond"])
second.append(["ft", "degF", "uS/cm"])
for z, t_ in zip([3, 6, 9], [68.0, 64.4, 59.0]):
    second.append([z, t_, 210])
book.save(path("two-sheets.xlsx"))
