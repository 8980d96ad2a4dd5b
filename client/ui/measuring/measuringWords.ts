import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { Caution } from "./cautions";

type MeasuringWords = {
  /** One sentence: how a part of this kind is measured. */
  how: string;
  /** What to do for each dimension. */
  steps: Partial<Record<DimensionName, string>>;
  mistakes: readonly string[];
  cautions: readonly Caution[];
};

/*
 * How each kind is measured. Common practice, no source: the pages that show these words say so.
 */
const wheelSteps = {
  bore: "Open the inside jaws in the hole until they just bind. Turn them a quarter and read again: a difference shows a hole worn oval.",
  treadWidth: "Close the jaws on the two edges of the rubber, not on the metal.",
  overallHeight: "Close the jaws on the two end faces of the metal, over its whole length.",
};

const loopMistakes = [
  "Measuring the belt stretched round a rule: it must lie straight but slack.",
  "Reading the outside of the fold: the inside of a loop is what its pulleys touch.",
];
const squeezed = "Squeezing: soft rubber gives way, and the reading comes out small.";

export const measuringWords: Record<PartKind, MeasuringWords> = {
  "idler-wheel": {
    how: "Take the diameter at three places round the rubber, then the hole and the metal.",
    steps: {
      outsideDiameter:
        "Close the jaws on the rubber until they just touch. Take three readings, a third of a turn apart; a flat spot shows as a low one.",
      ...wheelSteps,
      secondTreadDiameter: "On a stepped wheel, take the other tread in the same way, three times round.",
    },
    mistakes: [
      squeezed,
      "One reading only, across the flat: the wheel comes out too small.",
      "Bore taken with the tips of the jaws tilted: hold them along the hole.",
      "Hub length written as tread width: the tread is rubber, the height is metal.",
    ],
    cautions: ["power", "spinning", "dust"],
  },
  "pinch-roller": {
    how: "Take the diameter at three places, in the middle and near both ends: these rollers wear to a cone or a waist.",
    steps: {
      outsideDiameter:
        "Close the jaws on the rubber until they just touch, near each end and in the middle. Leave out the groove that the tape wore.",
      ...wheelSteps,
    },
    mistakes: [
      squeezed,
      "Measuring in the groove of the tape: the roller comes out too small.",
      "Taking the bore of the bush for that of the rubber: the hole that runs on the pin counts.",
      "Sleeve length written as tread width: the tread is rubber, the height is metal.",
    ],
    cautions: ["power", "spinning", "solvent"],
  },
  "flat-belt": {
    how: "Lay the belt flat beside a rule, take the inside from fold to fold, and double it.",
    steps: {
      insideCircumference:
        "Pull the loop straight, not longer, and read the inside from fold to fold. Twice that is the inside circumference.",
      width: "Close the jaws on both edges until they just touch, at three places.",
      thickness: "One layer between the jaws, barely held. Take three places: old belts are uneven.",
    },
    mistakes: [
      ...loopMistakes,
      "Forgetting to double the length from fold to fold.",
      "Thickness of two layers, or of a squeezed one.",
    ],
    cautions: ["power", "tar", "solvent"],
  },
  "square-belt": {
    how: "Lay the belt flat beside a rule, take the inside from fold to fold, and double it; then one side of the square.",
    steps: {
      insideCircumference:
        "Pull the loop straight, not longer, and read the inside of both folds. Twice that is the inside circumference.",
      section: "Close the jaws on two opposite sides until they just touch, at three places.",
    },
    mistakes: [
      ...loopMistakes,
      "Measuring across the corners: the section is the side of the square.",
      "Measuring where the belt is twisted: let it lie flat first.",
    ],
    cautions: ["power", "tar", "solvent"],
  },
  "round-belt": {
    how: "Lay a string once round the inside of the loop, then lay the string on a rule.",
    steps: {
      insideCircumference:
        "Lay the belt on paper as a loop, a thin string once round its inside, and mark where the ends meet. The string, laid straight, is the inside circumference.",
      section: "Close the jaws on the cord until they just touch. Turn the cord a quarter and read again.",
    },
    mistakes: [
      ...loopMistakes,
      "A string that stretches: take thin dry twine, and pull it no tighter on the rule than in the belt.",
      "A thick string: it runs inside the belt by half its own thickness, so the loop comes out small.",
    ],
    cautions: ["power", "tar", "solvent"],
  },
  "drive-ring": {
    how: "Take the ring off its hub, let it rest for an hour, and measure it lying free.",
    steps: {
      insideDiameter:
        "Lay the ring flat. Open the inside jaws until they just touch, in two directions, without stretching it.",
      section: "Round cord: close the jaws on it until they just touch, at three places.",
      width: "Flat ring: across it, along the axis of the wheel.",
      height: "Flat ring: from its inside to its outside, through the wall.",
    },
    mistakes: [
      "Measuring it on the hub: there it is stretched and thinner.",
      "Pushing the jaws apart until the ring is round: it is stretched then.",
      "Writing the hub’s diameter as the ring’s: the ring is smaller when free.",
      squeezed,
    ],
    cautions: ["power", "spinning", "tar"],
  },
  "motor-mount": {
    how: "Measure the best of the set: the others have sagged under the motor.",
    steps: {
      outsideDiameter: "Across the larger flange, at two places a quarter turn apart.",
      insideDiameter:
        "Open the inside jaws in the hole until they just touch. Take out the metal sleeve first, if there is one.",
      grooveDiameter: "With the thin tips of the jaws in the bottom of the groove. The hole in the chassis is a check.",
      grooveWidth: "Between the two flanges with the inside jaws. The sheet that sits in it is a check.",
      height: "From end face to end face, without load.",
    },
    mistakes: [
      "Measuring a sagged mount: its height and its groove come out too small.",
      squeezed,
      "Taking the sleeve for the hole of the rubber.",
    ],
    cautions: ["power", "tar"],
  },
  "brake-pad": {
    how: "Take the pad off its holder and measure it lying free.",
    steps: {
      length: "The longer side, at two places.",
      width: "The shorter side, at two places.",
      thickness: "At a corner that never touched the wheel, and in the middle of the worn face.",
    },
    mistakes: [
      "Measuring over old glue or the metal holder.",
      "Taking the worn middle for the thickness when new.",
      "Squeezing: felt and soft rubber give way, and the reading comes out small.",
    ],
    cautions: ["power", "spinning", "solvent", "dust"],
  },
  "clutch-felt": {
    how: "Lift the felt off, brush it, and measure it lying flat; let the jaws touch and not press.",
    steps: {
      outsideDiameter: "Close the jaws until they just touch the edge, at two places a quarter turn apart.",
      insideDiameter: "Open the inside jaws in the hole until they just touch. The hub that it sits on is a check.",
      thickness: "Between the jaws, barely held, where the felt was not pressed.",
    },
    mistakes: [
      "Squeezing: felt has no firm face, so stop at the first touch.",
      "Measuring fluff at the edge: trim loose hairs first.",
      "Peeling a glued felt: it tears and grows. Measure it where it sits.",
    ],
    cautions: ["power", "spinning", "solvent"],
  },
};
