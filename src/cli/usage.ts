/** The words of `layerhead --help` and of each command's --help. */

export const USAGE = `layerhead: pressure in layered water

usage: layerhead COMMAND [OPTIONS] FILE...

commands
  column FILE...   integrate casts: density, pressure and departure at every sample
  compare FILE...  tell what depth times one specific weight costs, against the
                   integrated pressure
  water FILE|-     add water properties to a table of points
  inspect FILE...  tell how each file is read: columns, units, casts, rows left out

layerhead COMMAND --help tells a command's options; layerhead --version the version.
Exit status: 0 done, 1 fault in the program, 2 bad input, 64 bad usage.
`;

export const COLUMN_USAGE = `usage: layerhead column FILE... [OPTIONS]

Reads cast files (delimited text, workbooks, netCDF), integrates each cast from the water
surface down and prints a table per cast.

what is assumed beyond the samples
  --latitude DEG           latitude for gravity, -90 to 90 (else from the file, else
                           standard gravity 9.80665 m/s2)
  --water MODEL            teos10 (default), exact, limnological, eos80 or
                           constant:RHO with RHO in kg/m3
  --salinity S             practical salinity where none was measured (default 0)
  --air-pressure KPA       absolute, at the water surface (default 101.325)
  --reference-density RHO  density of the constant-density estimate: kg/m3, surface
                           (of this column) or mean (of this column); default 1025
  --depth-made HOW         how the depth column came to be: measured (default),
                           standard-ocean, or constant:RHO with RHO in kg/m3
  --bed M                  depth of the bed below the surface

how files are read
  --read ROLE=HEADER:UNIT,...
                           what a column is, where the file leaves it open or is
                           wrong; unit may be left out, role may be unused
  --sheet NAME             sheet of a workbook (default: the first with casts)
  --stations FILE          list of stations (station, latitude, longitude, distance,
                           water depth) to join to the casts by name
  --way WAY                part of a raw record: auto (default), down, up, all
  --bins M                 means of 0.1, 0.25, 0.5 or 1 m, or none (default)
  --water-kind KIND        what is plausible: any (default), fresh, estuary, sea

what comes out
  --levels M,M,...         depths to report besides the samples
  --uncertainty            how far each pressure may be off (95 %), what makes it so at
                           each level (or at the bottom), and what would help most
  --monte-carlo N          N trials with all errors drawn at random, as a cross-check
                           there; 10000 or more tell (on the terminal and in --json)
  --seed S                 whole number that the trials follow from (default 1)
  --json                   one JSON object on standard output, full precision
  --out DIR                one CSV per cast and summary.csv, each with its metadata

Water above the first and below the last sample has that sample's salinity and
temperature. Files that cannot be read are named on standard error; the others are
still done, and the exit status is then 2.
`;

export const COMPARE_USAGE = `usage: layerhead compare FILE... [OPTIONS]

Holds depth times a specific weight against the integrated pressure, for every weight an
engineer might take: handbook values in SI and US units, fresh and sea water, and the
surface sample, depth mean and last sample of each cast. Tells the error in kPa, as a
head and in per cent, and by how much a gauge that turns pressure into depth with that
weight reads too deep. Positive: the shortcut says too much.

  --levels M,M,...         depths to compare at (default: the bottom of each cast)
  --reference-density RHO  a density of your own, kg/m3, besides
  --json                   one JSON object on standard output
  and the other options of layerhead column, but for --out, --uncertainty, --monte-carlo
`;

export const WATER_USAGE = `usage: layerhead water FILE.csv|-

Reads a table of points and writes it to standard output as CSV with TEOS-10 properties
added, at full precision. Columns it needs, by these names:
  one of practical_salinity, absolute_salinity_g_kg, conductivity_mS_cm
  temperature_degC         in situ, ITS-90
  sea_pressure_dbar        zero at the water surface
Other columns are passed through. - reads standard input.
`;

export const INSPECT_USAGE = `usage: layerhead inspect FILE... [OPTIONS]

Tells how each file is read: which column became what, in which unit, how sure that is
and why, the questions left open, the casts found, how stations were joined, and every
sample that is flagged or left out, with the reason. No pressure is computed.

  --read, --sheet, --stations, --way, --bins, --water-kind
                           as for layerhead column
  --json                   the same as one JSON object
`;
