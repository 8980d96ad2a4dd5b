const names: Readonly<Record<string, string>> = {
  stepDiameter: "Motor step",
  idlerDiameter: "Idler",
  idlerLargeDiameter: "Idler, large tread",
  idlerSmallDiameter: "Idler, small tread",
  rimDiameter: "Platter rim",
  pulleyDiameter: "Motor pulley",
  drivenDiameter: "Driven pulley",
  beltThickness: "Belt thickness",
  capstanDiameter: "Capstan",
};

/** What a size is called, by its path in the computation. With one stage only, stages are not counted. */
export function sizeName(field: string, stages = 1): string {
  const [, at, part] = /^stages\/(\d)\/(\w+)$/.exec(field) ?? [];
  if (at === undefined) return names[field] ?? field;
  const driver = at === "0" ? "Motor pulley" : "Driver";
  const driven = Number(at) === stages - 1 ? "Flywheel" : "Driven";
  const name = part === "driver" ? driver : part === "driven" ? driven : "Belt thickness";
  return stages > 1 ? `${name}, stage ${Number(at) + 1}` : name;
}

/** Whether a size is measured along a belt's thickness rather than across a wheel. */
export const isThickness = (field: string): boolean => field.endsWith("beltThickness");
