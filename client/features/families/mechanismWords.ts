import type { MechanismKind } from "#shared/schemas/catalogue";

export const mechanismWords: Record<MechanismKind, { one: string; many: string }> = {
  "record-changer": { one: "record changer", many: "Record changers" },
  "manual-turntable": { one: "manual turntable", many: "Manual turntables" },
  "reel-to-reel-deck": { one: "reel-to-reel deck", many: "Reel-to-reel decks" },
  "cassette-deck": { one: "cassette deck", many: "Cassette decks" },
  "wire-recorder": { one: "wire recorder", many: "Wire recorders" },
  "dictation-machine": { one: "dictation machine", many: "Dictation machines" },
  "cine-projector": { one: "cine projector", many: "Cine projectors" },
};
