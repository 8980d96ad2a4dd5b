import { SearchQuery } from "#shared/schemas/search";
import { type Dice, dice } from "./dice";

const bores = ["2.00", "3.00", "4.00", "5.00", "6.00", "8.00"];
const lines = ["platter idler", "capstan roller", "cycle ring ground", "flywheel belt moulded", "motor mount firm"];
const slips = ["plater idler", "capstna roller", "cycle ring gruond", "flywhele belt", "moter mount firm"];

function wheel({ between, pick }: Dice, dimensions: number) {
  const sizes = {
    outsideDiameter: between(20, 88).toFixed(1),
    bore: pick(bores),
    treadWidth: between(2, 10).toFixed(1),
  };
  return { kind: "idler-wheel", ...Object.fromEntries(Object.entries(sizes).slice(0, dimensions)) };
}

/** What is searched for in the bench, by name: each a maker of queries that differ from one to the next. */
const makers: Record<string, (roll: Dice) => object> = {
  "one dimension": (roll) => wheel(roll, 1),
  "two dimensions": (roll) => wheel(roll, 2),
  "three dimensions": (roll) => wheel(roll, 3),
  words: ({ pick }) => ({ q: pick(lines) }),
  "mistyped words": ({ pick }) => ({ q: pick(slips) }),
};

/** `count` queries of each sort, the same in every run. */
export function benchQueries(count: number): [name: string, queries: SearchQuery[]][] {
  return Object.entries(makers).map(([name, make], n) => {
    const roll = dice(n + 1);
    return [name, Array.from({ length: count }, () => SearchQuery.parse({ condition: "glazed", ...make(roll) }))];
  });
}
