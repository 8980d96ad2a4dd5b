/** One standard ring: its number as text ("011") and sizes in mm, exact (inch x 25.4). */
export type ORingSize = {
  dash: string;
  insideDiameterMm: number;
  insideDiameterTolMm: number;
  sectionMm: number;
  sectionTolMm: number;
};

/** From here to the end all numbers are thousandths of an inch. */
type Section = readonly [thou: number, plusMinus: number];

const mm = (thou: number) => (thou * 254) / 10_000;

function ring(dash: number, id: number, idTol: number, [section, sectionTol]: Section): ORingSize {
  return {
    dash: String(dash).padStart(3, "0"),
    insideDiameterMm: mm(id),
    insideDiameterTolMm: mm(idTol),
    sectionMm: mm(section),
    sectionTolMm: mm(sectionTol),
  };
}

/** "70+31.25x2 114+62.5x3": two numbers from 70 in steps of 31.25, three from 114. "5x2 7x3": two fives, three sevens. */
function unroll(runs: string): number[] {
  return runs.split(" ").flatMap((run) => {
    const [first = 0, step = 0, count = 0] = run
      .replace(/^([^+]+)x/, "$1+0x")
      .split(/[+x]/)
      .map(Number);
    return Array.from({ length: count }, (_, i) => first + i * step);
  });
}

/** Inside diameters step by fractions of an inch, rounded to a thousandth with halves down. */
function series(firstDash: number, section: Section, diameters: string, tolerances: string): ORingSize[] {
  const plusMinus = unroll(tolerances);
  return unroll(diameters).map((id, i) => ring(firstDash + i, Math.ceil(id - 0.5), plusMinus[i]!, section));
}

/**
 * The 369 sizes of SAE AS568 (001 to 050, 102 to 178, 201 to 284, 309 to 395, 425 to 475, and 20 of the 900s), in the
 * order of their numbers: dimensions and tolerances as openly reproduced by a maker of seals; each inside diameter from
 * 006 to 475 was checked to be a fraction of an inch less the constant of its series.
 */
export const oRingTable: readonly ORingSize[] = [
  ring(1, 29, 4, [40, 3]),
  ring(2, 42, 4, [50, 3]),
  ring(3, 56, 4, [60, 3]),
  ...series(
    4,
    [70, 3],
    "70+31.25x2 114+31.25x5 301.5+62.5x18 1489+125x13 3239+250x9",
    "5x11 7x1 9x6 10x3 11x3 13x3 15x2 18x5 20x3 24x3 27x2 30x3 37x2",
  ),
  ...series(
    102,
    [103, 3],
    "49.5+31.25x7 299.5+62.5x26 1925+62.5x16 2987+250x28",
    "5x11 7x1 9x3 10x6 12x6 15x6 17x6 20x6 22x4 24x3 28x2 30x3 35x5 40x4 45x4 50x4 55x3",
  ),
  ...series(
    201,
    [139, 4],
    "171.5+62.5x22 1609+125x36 6234+250x16 10484+500x4 12984+1000x3 15955+1000x3",
    "5x6 7x1 9x2 10x6 12x6 15x3 18x3 20x4 24x7 28x5 30x5 35x10 40x4 45x4 50x4 55x5 65x6 75x1 80x1 85x1",
  ),
  ...series(
    309,
    [210, 5],
    "412.5+62.5x16 1475+125x37 6225+250x16 10475+500x4 12975+1000x3 15955+1000x7 22940+1000x4",
    "5x2 7x1 9x2 10x6 12x5 15x4 18x4 20x4 24x5 28x5 30x6 37x9 40x4 45x4 50x4 55x4 60x2 65x3 70x2 75x1 80x1 85x1 90x1 95x2 100x1 105x1 110x1 115x1 120x1",
  ),
  ...series(
    425,
    [275, 6],
    "4475+125x13 6225+250x8 8475+500x15 15955+500x9 20955+1000x2 22940+1000x4",
    "33x4 37x9 40x4 45x4 55x4 60x6 70x5 75x2 80x1 85x3 90x4 100x1 105x1 110x1 115x1 120x1",
  ),
  ring(901, 185, 5, [56, 3]),
  ring(902, 239, 5, [64, 3]),
  ring(903, 301, 5, [64, 3]),
  ring(904, 351, 5, [72, 3]),
  ring(905, 414, 5, [72, 3]),
  ring(906, 468, 5, [78, 3]),
  ring(907, 530, 7, [82, 3]),
  ring(908, 644, 9, [87, 3]),
  ring(909, 706, 9, [97, 3]),
  ring(910, 755, 9, [97, 3]),
  ring(911, 863, 9, [116, 4]),
  ring(912, 924, 9, [116, 4]),
  ring(913, 986, 10, [116, 4]),
  ring(914, 1047, 10, [116, 4]),
  ring(916, 1171, 10, [116, 4]),
  ring(918, 1355, 12, [116, 4]),
  ring(920, 1475, 14, [118, 4]),
  ring(924, 1720, 14, [118, 4]),
  ring(928, 2090, 18, [118, 4]),
  ring(932, 2337, 18, [118, 4]),
];
