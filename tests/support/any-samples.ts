import fc from "fast-check";

const sample = fc.record({
  stepM: fc.double({ min: 0.02, max: 8, noNaN: true }),
  practicalSalinity: fc.double({ min: 0, max: 40, noNaN: true }),
  inSituTempC: fc.double({ min: 0, max: 32, noNaN: true }),
});

/** What castOf takes, with steps of 2 cm to 8 m and any salinity and temperature an estuary or reservoir can have. */
export const anySamples = (fewestSamples: number, mostSamples: number) =>
  fc.array(sample, { minLength: fewestSamples, maxLength: mostSamples }).map((samples) => {
    let depth = 0;
    return {
      depthM: samples.map(({ stepM }) => (depth += stepM)),
      practicalSalinity: samples.map(({ practicalSalinity }) => practicalSalinity),
      inSituTempC: samples.map(({ inSituTempC }) => inSituTempC),
    };
  });
