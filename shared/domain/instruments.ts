export const instruments = [
  "digital-caliper",
  "vernier-caliper",
  "dial-caliper",
  "micrometer",
  "steel-rule",
  "tape-measure",
  "printed-gauge",
  "string",
] as const;
export type Instrument = (typeof instruments)[number];

type InstrumentFacts = {
  name: string;
  /** Name with its article, as used in a sentence. */
  withArticle: string;
  /** The smallest step that it shows or that is read from its scale, in mm. */
  stepMm: number;
  /** Whether it presses on the part, so that soft rubber gives way. */
  presses: boolean;
  /** Whether small inside sizes are taken with separate inside jaws, whose error is larger. */
  insideJaws: boolean;
};

export const instrumentFacts: Record<Instrument, InstrumentFacts> = {
  "digital-caliper": {
    name: "digital calliper",
    withArticle: "a digital calliper",
    stepMm: 0.01,
    presses: true,
    insideJaws: true,
  },
  // The commoner of the two vernier scales: where it is the 0.02 mm one, this errs on the safe side.
  "vernier-caliper": {
    name: "vernier calliper",
    withArticle: "a vernier calliper",
    stepMm: 0.05,
    presses: true,
    insideJaws: true,
  },
  "dial-caliper": {
    name: "dial calliper",
    withArticle: "a dial calliper",
    stepMm: 0.02,
    presses: true,
    insideJaws: true,
  },
  micrometer: { name: "micrometer", withArticle: "a micrometer", stepMm: 0.01, presses: true, insideJaws: false },
  "steel-rule": { name: "steel rule", withArticle: "a steel rule", stepMm: 0.5, presses: false, insideJaws: false },
  "tape-measure": { name: "tape measure", withArticle: "a tape measure", stepMm: 1, presses: false, insideJaws: false },
  "printed-gauge": {
    name: "printed gauge",
    withArticle: "a printed gauge",
    stepMm: 0.5,
    presses: false,
    insideJaws: false,
  },
  string: { name: "string", withArticle: "a string", stepMm: 1, presses: false, insideJaws: false },
};
