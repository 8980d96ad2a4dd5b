import type { Transaction } from "sequelize";
import { FitReport } from "../models/FitReport";
import { dice, idOf } from "./dice";
import type { SeededPart } from "./seedListings";
import { restorerNames, userId } from "./seedPeople";

/** Whether a part of these sizes would have fitted its point, so that reports and numbers agree. */
function missBy({ sizes, point }: SeededPart): number {
  const bore = sizes.bore && point.sizes.bore ? Math.abs(sizes.bore.nominalMm - point.sizes.bore) / 0.05 : 0;
  const wheel =
    sizes.outsideDiameter && point.sizes.outsideDiameter
      ? Math.abs(sizes.outsideDiameter.nominalMm - point.sizes.outsideDiameter) / 0.6
      : 0;
  return Math.max(bore, wheel);
}

/** Fit reports of the restorers on some of the parts. */
export async function seedReports(parts: readonly SeededPart[], transaction: Transaction): Promise<void> {
  for (const part of parts) {
    const known = part.point.familySlug === "tavrin-c4";
    if (dice(part.id, "reported") > (known ? 0.85 : 0.4)) continue;
    const miss = missBy(part);
    for (const name of restorerNames) {
      if (dice(part.id, name, "reports") > 0.45) continue;
      const outcome =
        miss > 1.2 ? "did-not-fit" : miss > 0.8 && dice(part.id, name) < 0.6 ? "fitted-after-work" : "fitted";
      await FitReport.create(
        { id: idOf(part.id, name), partId: part.id, servicePointId: part.point.id, userId: userId(name), outcome },
        { transaction },
      );
    }
  }
}
