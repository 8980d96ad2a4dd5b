import type { MechanismKind } from "#shared/schemas/catalogue";
import type { PlanName } from "./mechanismPlans";

export type DemoFamily = {
  slug: string;
  maker: string;
  name: string;
  kind: MechanismKind;
  plan: PlanName;
  models: readonly string[];
  about: string;
};

/** Every maker, family and model here is invented. */
export const demoFamilies: readonly DemoFamily[] = [
  {
    slug: "tavrin-c4",
    maker: "Tavrin",
    name: "C4",
    kind: "record-changer",
    plan: "changer",
    models: ["Tavrin Serenade C4", "Lorrimer Parlour 44", "Castlebay Autochange"],
    about:
      "Four-speed changer, sold under three badges. The motor hangs on three grommets; the platter idler slides on a step pulley.",
  },
  {
    slug: "tavrin-c7",
    maker: "Tavrin",
    name: "C7",
    kind: "record-changer",
    plan: "changer",
    models: ["Tavrin Soloist C7", "Lorrimer Cabinet 7"],
    about: "The C4's heavier follower: a longer spindle, a wider tread, a brass bush that wears oval.",
  },
  {
    slug: "ostholm-vaxlare",
    maker: "Ostholm",
    name: "Series 12",
    kind: "record-changer",
    plan: "changer",
    models: ["Ostholm 12A", "Ostholm 12B", "Marstrand Table 12"],
    about: "A changer with a felt slip clutch in the cycling gear: when records stop dropping, look there first.",
  },
  {
    slug: "pellworth-drop",
    maker: "Pellworth",
    name: "Minidrop",
    kind: "record-changer",
    plan: "changer",
    models: ["Pellworth Minidrop", "Pellworth Minidrop Stereo"],
    about: "Small and light, with a stepped idler that hardens to a bell.",
  },
  {
    slug: "merridew-t2",
    maker: "Merridew",
    name: "T2",
    kind: "manual-turntable",
    plan: "belt-table",
    models: ["Merridew T2", "Merridew T2 Studio"],
    about: "Sub-platter and flat belt. Two speeds by moving the belt on a stepped pulley.",
  },
  {
    slug: "vantorre-rim",
    maker: "Vantorre",
    name: "Rimline",
    kind: "manual-turntable",
    plan: "changer",
    models: ["Vantorre Rimline 50", "Vantorre Rimline 60"],
    about: "Heavy platter, rim drive; the idler must be round to a few hundredths or it rumbles.",
  },
  {
    slug: "solvane-r9",
    maker: "Solvane",
    name: "R9",
    kind: "reel-to-reel-deck",
    plan: "reel-deck",
    models: ["Solvane R9", "Solvane R9 Portable", "Kestrelman 900"],
    about: "One motor does everything through belts and idlers. The capstan belt turns to tar.",
  },
  {
    slug: "brask-duo",
    maker: "Brask",
    name: "Duo",
    kind: "reel-to-reel-deck",
    plan: "reel-deck",
    models: ["Brask Duo 4", "Brask Duo 6"],
    about: "Two tracks, three speeds, felt brakes on both spindles.",
  },
  {
    slug: "corvane-studio",
    maker: "Corvane",
    name: "Studio 3",
    kind: "reel-to-reel-deck",
    plan: "reel-deck",
    models: ["Corvane Studio 3"],
    about: "A deck for schools: strong, heavy, and always short of take-up.",
  },
  {
    slug: "lindquay-pavo",
    maker: "Lindquay",
    name: "Pavo",
    kind: "cassette-deck",
    plan: "cassette-deck",
    models: ["Lindquay Pavo", "Lindquay Pavo Due", "Aldersea Compact"],
    about: "One square main belt, a tyred idler between the reels, and a counter belt that is forgotten.",
  },
  {
    slug: "zirnow-draht",
    maker: "Zirnow",
    name: "Draht 2",
    kind: "wire-recorder",
    plan: "wire-recorder",
    models: ["Zirnow Draht 2", "Zirnow Bureau"],
    about: "Wire at two feet a second: the drive idler runs hot and loses its edge.",
  },
  {
    slug: "ellmark-memo",
    maker: "Ellmark",
    name: "Memo",
    kind: "dictation-machine",
    plan: "dictation",
    models: ["Ellmark Memo", "Ellmark Memo Desk"],
    about: "A disc dictation machine with a round belt, and rings on the feed rollers.",
  },
  {
    slug: "harrowlight-eight",
    maker: "Harrowlight",
    name: "Eight",
    kind: "cine-projector",
    plan: "cine",
    models: ["Harrowlight Eight", "Harrowlight Eight Sound"],
    about: "Three round belts and two rings, in a lamp house that bakes them.",
  },
];
