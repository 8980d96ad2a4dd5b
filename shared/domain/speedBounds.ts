/** What the speed gauge takes, from and up to; slip stays below its end. Frequencies in Hz, lengths in mm. */
export const speedBounds = {
  mainsHz: [10, 400],
  poles: [2, 48],
  slipPercent: [0, 100],
  diameterMm: [0.1, 5000],
  thicknessMm: [0, 50],
  stages: [1, 8],
} as const;
