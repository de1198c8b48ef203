/**
 * Makes the two demonstration surveys, the same bytes on every run: node sample-data/make-sample-data.mjs
 * Everything here is invented: places, crews, water. See README.md beside this file.
 */
import { writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";

/** mulberry32: 32 bits of state are plenty for noise. */
function randomFrom(seed) {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Sum of twelve uniforms: no logarithm, so that every engine gives the same digits. */
const normalFrom = (random) => () => Array.from({ length: 12 }, random).reduce((a, b) => a + b, -6);

/** 0 well above the depth, 1 well below; rational, for the same reason. */
const step = (depthM, centreM, thicknessM) => {
  const x = (2 * (depthM - centreM)) / thicknessM;
  return 0.5 * (1 + x / Math.sqrt(1 + x * x));
};

const clockAt = (startS, addedS) => {
  const s = Math.round(startS + addedS);
  const two = (n) => String(n).padStart(2, "0");
  return `${two(Math.floor(s / 3600))}:${two(Math.floor(s / 60) % 60)}:${two(s % 60)}`;
};

const write = (name, lines) => writeFileSync(fileURLToPath(new URL(name, import.meta.url)), `${lines.join("\n")}\n`);

// ---------------------------------------------------------------------------------------------------------------------
// The Corrow estuary: a salt wedge that thins and freshens from the sea to a weir.

/** [salinity, temperature] at the top and in the wedge; centre and thickness of the halocline, m; start, hours. */
const ESTUARY = [
  { station: "Mouth", km: 0, bedM: 18.8, top: [24.6, 15.4], wedge: [33, 11.6], centreM: 4.6, thicknessM: 3.6, start: 9.2 },
  { station: "Quay", km: 2.7, bedM: 16.4, top: [19.8, 15.8], wedge: [32.2, 11.8], centreM: 4.9, thicknessM: 3, start: 9.7 },
  { station: "Ferry", km: 5.1, bedM: 14.9, top: [14.1, 16.3], wedge: [31.1, 12.1], centreM: 5.3, thicknessM: 2.4, start: 10.2 },
  { station: "Bend 4", km: 8.4, bedM: 13.2, top: [8.7, 16.8], wedge: [29, 12.6], centreM: 5.8, thicknessM: 1.9, start: 10.9 },
  { station: "Old Mill", km: 11.9, bedM: 12.1, top: [3.9, 17.2], wedge: [25.4, 13.3], centreM: 6.9, thicknessM: 1.5, start: 11.5 },
  { station: "Rail Bridge", km: 15.2, bedM: 10.6, top: [1.1, 17.6], wedge: [17.8, 14.4], centreM: 8.2, thicknessM: 1.1, start: 12.1 },
  { station: "Weir Pool", km: 18.6, bedM: 9.3, top: [0.2, 17.9], wedge: [0.3, 17.5], centreM: 7.5, thicknessM: 2, start: 12.8 },
];

const SPACING_M = 0.25;

/** Depths of one lowering: a gap at the top, a soak at one station, a short reversal at another. */
function estuaryDepths({ station, bedM }, random) {
  const first = station === "Bend 4" ? 1.3 : 0.45;
  const depths = [];
  if (station === "Quay") {
    // The probe waits at the surface to wet and warm up, and rides the swell.
    for (let i = 0; i < 8; i++) depths.push(first + 0.35 + 0.12 * (i % 2 === 0 ? -1 : 1) + 0.05 * (random() - 0.5));
  }
  for (let depthM = first; depthM < bedM - 0.35; depthM += SPACING_M) depths.push(depthM + 0.06 * (random() - 0.5));
  if (station === "Ferry") {
    // The winch is checked and the cable comes back a little.
    const at = depths.findIndex((depthM) => depthM > 9);
    depths.splice(at, 0, depths[at - 1] - 0.31, depths[at - 1] - 0.52, depths[at - 1] - 0.2);
  }
  return depths;
}

function estuaryLines() {
  const random = randomFrom(20260517);
  const normal = normalFrom(random);
  const lines = [
    "# Corrow estuary, spring tide, high water slack. INVENTED demonstration data: this place does not exist.",
    "# One lowering at each station, seaward to landward; coordinates are made up.",
    "# Practical salinity (PSS-78) from conductivity; temperature ITS-90; depth from pressure.",
    "Station,Date,Time,Latitude,Longitude,Distance from mouth,Depth,Temperature,Salinity,Turbidity",
    ",,,degrees_north,degrees_east,km,m,degC,PSU,NTU",
  ];
  for (const place of ESTUARY) {
    // Mid-ocean on purpose. A straight line is shorter than the channel: 0.87 km for each km along it.
    const latitude = (51.4 + 0.0031 * place.km).toFixed(4);
    const longitude = (-29.5 + 0.0115 * place.km).toFixed(4);
    estuaryDepths(place, random).forEach((depthM, i) => {
      const share = step(depthM, place.centreM, place.thicknessM);
      const isSpike = place.station === "Old Mill" && i === 17;
      const salinity = place.top[0] + (place.wedge[0] - place.top[0]) * share + 0.004 * normal() + (isSpike ? 6.2 : 0);
      const temperature = place.top[1] + (place.wedge[1] - place.top[1]) * share + 0.004 * normal();
      const turbidity = 6 + 22 * step(depthM, place.bedM - 1.5, 2) + 0.6 * Math.abs(normal());
      const clock = clockAt(place.start * 3600, i * 1.5);
      const isMissing = place.station === "Rail Bridge" && i === 12;
      const cells = [place.station, "2026-05-17", clock, latitude, longitude, place.km.toFixed(1)];
      const values = [depthM.toFixed(2), temperature.toFixed(3), isMissing ? "" : salinity.toFixed(3), turbidity.toFixed(1)];
      lines.push([...cells, ...values].join(","));
    });
  }
  return lines;
}

// ---------------------------------------------------------------------------------------------------------------------
// Halvane reservoir: drinking water in late summer, with a weak bottom layer that holds more ions.

const RESERVOIR = [
  { station: "Dam", bedM: 30.2, start: 9.05 },
  { station: "Narrows", bedM: 23.6, start: 10.1 },
  { station: "Inlet Arm", bedM: 14.2, start: 11.2 },
];

function reservoirLines() {
  const random = randomFrom(19870822);
  const normal = normalFrom(random);
  const lines = [
    "# Halvane reservoir, late summer. INVENTED demonstration data: this place does not exist.",
    "Site,DateTime,Depth (m),Temperature (degC),Specific Conductance (uS/cm)",
  ];
  for (const { station, bedM, start } of RESERVOIR) {
    let row = 0;
    for (let nominalM = 0.2; nominalM < bedM - 0.3; nominalM += 0.5) {
      const depthM = nominalM + 0.05 * (random() - 0.5);
      const cooling = 11.6 * step(depthM, 8.4, 4.5) + 5.3 * step(depthM, 15, 16) + 0.006 * depthM;
      const temperature = 24.1 - cooling + 0.006 * normal();
      const conductance = 184 + 9 * step(depthM, 9, 5) + 44 * step(depthM, 27.2, 1.8) + 0.4 * normal();
      const clock = clockAt(start * 3600, row * 5);
      const values = [depthM.toFixed(2), temperature.toFixed(2), conductance.toFixed(0)];
      lines.push([station, `2026-08-22 ${clock}`, ...values].join(","));
      row += 1;
    }
  }
  return lines;
}

write("corrow-estuary.csv", estuaryLines());
write("halvane-reservoir.csv", reservoirLines());
