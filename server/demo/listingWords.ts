import type { PartKind } from "#shared/domain/partKinds";
import type { Material } from "#shared/schemas/part";

/** How workshops title what they make; `{place}` is the service point, first letter as it stands. */
export const titles: Record<PartKind, readonly string[]> = {
  "idler-wheel": [
    "{Place}, ground after moulding",
    "{Place} with bronze bush",
    "Idler wheel, cast, for {place}",
    "{Place}, soft compound",
    "Idler, new tread on new hub",
  ],
  "pinch-roller": [
    "Pinch roller, ground true",
    "Pinch roller with sintered bush",
    "Pinch roller, soft compound",
    "Pinch roller, cast",
  ],
  "flat-belt": ["Flat belt, ground both sides", "Flat belt, moulded endless", "{Place}, cut on the ring"],
  "square-belt": ["Square belt, moulded", "Square belt, ground", "{Place}, square section"],
  "round-belt": ["Round belt, welded", "Round belt, moulded endless", "{Place}, round section"],
  "drive-ring": ["Drive ring for pressed hub", "Tyre, round section", "{Place}, moulded"],
  "motor-mount": ["Motor grommet", "Motor mount, soft", "Isolator bush for motor"],
  "brake-pad": ["Brake pad, punched", "{Place} pad", "Brake block"],
  "clutch-felt": ["Clutch felt, punched ring", "Slip felt for {place}", "Clutch felt, dense"],
};

export const made: Record<Material, string> = {
  NBR: "Nitrile rubber, resists the oil of the bearing.",
  CR: "Chloroprene, ages slowly and keeps its grip.",
  EPDM: "EPDM, does not harden in warm machines; keep mineral oil away.",
  silicone: "Silicone, soft and very stable; less grip than chloroprene.",
  polyurethane: "Cast polyurethane, wears little; not for tropical damp.",
  "natural-rubber": "Natural rubber, the quietest; keep it from oil and sun.",
  cork: "Pressed cork, fine grain.",
  felt: "Wool felt of 0.36 g/cm3.",
};

export const finishes: Record<"ground" | "moulded" | "unstated", string> = {
  ground: "Ground to size and measured piece by piece.",
  moulded: "Moulded in a steel mould; sampled by calliper.",
  unstated: "Made by hand in small runs.",
};

/** Typical hardness of a compound for this kind, Shore A; felt and cork have none. */
export const hardness: Record<Material, readonly number[] | null> = {
  NBR: [45, 50, 60],
  CR: [45, 50, 55],
  EPDM: [50, 55, 60],
  silicone: [40, 50],
  polyurethane: [60, 70],
  "natural-rubber": [35, 40],
  cork: null,
  felt: null,
};

/** What one costs, roughly, in minor units. */
export const basePrice: Record<PartKind, number> = {
  "idler-wheel": 2400,
  "pinch-roller": 2900,
  "flat-belt": 1150,
  "square-belt": 690,
  "round-belt": 620,
  "drive-ring": 540,
  "motor-mount": 480,
  "brake-pad": 380,
  "clutch-felt": 420,
};

export const weightG: Record<PartKind, number> = {
  "idler-wheel": 28,
  "pinch-roller": 35,
  "flat-belt": 6,
  "square-belt": 3,
  "round-belt": 4,
  "drive-ring": 4,
  "motor-mount": 5,
  "brake-pad": 2,
  "clutch-felt": 2,
};
