/** How far a source can be trusted: read in the standard, quoted by somebody else, or recalled and not looked up. */
export type SpeedLimitStatus = "seen in print" | "secondary" | "from memory";
export type SpeedLimit = {
  name: string;
  medium: "record" | "tape";
  use: "playing" | "recording";
  lowerPercent: number;
  upperPercent: number;
  source: string;
  status: SpeedLimitStatus;
};

const limit = (
  medium: SpeedLimit["medium"],
  name: string,
  [lowerPercent, upperPercent]: [number, number],
  source: string,
  status: SpeedLimitStatus,
  use: SpeedLimit["use"] = "playing",
): SpeedLimit => ({ name, medium, use, lowerPercent, upperPercent, source, status });

const forum = "Attributed to DIN in a forum, mean over 30 s";

/**
 * Published limits of the mean speed, in percent of the rated speed, ends included. No others were found: the playback
 * limits of IEC 60098, BS 1928, IEC 60094-1 and IEC 60581-3 and -4 are open.
 */
export const speedLimits: readonly SpeedLimit[] = [
  limit("record", "Turntable", [-1, 1.5], "DIN 45500 part 3, quoted in 1984", "secondary"),
  limit("record", "Cutting a record", [-0.5, 0.5], "IEC 60098:2020 clause 5.6", "seen in print", "recording"),
  limit("record", "Studio turntable", [-0.3, 0.3], "NAB disc reproducing 1964", "from memory"),
  limit("tape", "Tape machine", [-1.5, 1.5], "DIN 45500 Blatt 4, mean over 30 s", "secondary"),
  limit("tape", "Studio machine", [-0.2, 0.2], forum, "secondary"),
  limit("tape", "Home reel", [-2, 2], forum, "secondary"),
  limit("tape", "Cassette", [-3, 3], forum, "secondary"),
  limit("tape", "Studio reel", [-0.2, 0.2], "NAB reel tape 1965", "from memory"),
];
