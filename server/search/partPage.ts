import type { z } from "zod";
import type { PostageRate } from "#shared/domain/postage";
import type { FitClaim, PartPage } from "#shared/schemas/catalogue";
import type { NeedQuery } from "#shared/schemas/need";
import { select } from "../db/select";
import { AppError } from "../errors/AppError";
import { MeasuredItem } from "../models/MeasuredItem";
import { Part } from "../models/Part";
import { Photo } from "../models/Photo";
import { Workshop } from "../models/Workshop";
import { presentFit } from "../presenters/presentFit";
import { presentParts, presentPhoto } from "../presenters/presentParts";
import { presentTrader, presentWorkshop } from "../presenters/presentWorkshop";
import { assessRow, compareFits, explainFit } from "./assessRow";
import { evidenceOf } from "./evidenceOf";
import { landedOf, loadSizes } from "./loadRows";
import { readNeed } from "./readNeed";
import { dimensionsIn } from "./Target";

const claimsSql = `
  SELECT f.slug AS "familySlug", f.name AS "familyName", s.name AS "servicePointName", c.evidence
  FROM fit_claims c JOIN service_points s ON s.id = c.service_point_id JOIN families f ON f.id = s.family_id
  WHERE c.part_id = $partId::uuid ORDER BY f.name, s.number`;

/** A part that everybody may look at: offered now, or retired. Errors: `not-found`. */
async function shownPart(partId: string): Promise<{ part: Part; workshop: Workshop }> {
  const part = await Part.findByPk(partId);
  if (!part || (part.state !== "published" && part.state !== "retired")) throw new AppError("not-found");
  const workshop = await Workshop.findByPk(part.workshopId);
  if (workshop?.state !== "admitted") throw new AppError("not-found");
  return { part, workshop };
}

/** How a part, or the best line of a kit, fits what is asked for; null where nothing of it can be checked. */
async function bestFit(part: Part, query: NeedQuery) {
  const kind = query.kind ?? (part.kind === "rebuild-kit" ? undefined : part.kind);
  const read = await readNeed({ ...query, kind });
  const items = read.targets.length > 0 ? await MeasuredItem.findAll({ where: { partId: part.id } }) : [];
  const sizes = await loadSizes(
    items.map(({ id }) => id),
    dimensionsIn(read.targets),
  );
  const fits = items.flatMap(({ id, kind }) => {
    const row = { kind, sizes: sizes.get(id) ?? {} };
    const assessed = assessRow(row, read.targets);
    return assessed ? [{ row, ...assessed }] : [];
  });
  const best = fits.sort((a, b) => compareFits(a.fit, b.fit))[0];
  const severalPoints = new Set(read.targets.map(({ point }) => point?.id)).size > 1;
  const pointName = severalPoints ? (best?.target.point?.name ?? null) : null;
  return { ...read, fit: best ? presentFit(explainFit(best.row, best.target), pointName) : null };
}

const postageSql = `
  SELECT r.base_minor AS "baseMinor", r.per_item_minor AS "perItemMinor", r.free_over_minor AS "freeOverMinor"
  FROM shipping_countries c JOIN shipping_rates r ON r.id = c.rate_id AND r.currency = $currency
  WHERE c.workshop_id = $workshopId::uuid AND c.country = $shipTo`;

async function landedIn({ priceMinor, currency, workshopId }: Part, shipTo: string) {
  const [rate] = await select<PostageRate>(postageSql, { workshopId, shipTo, currency });
  return landedOf(priceMinor, rate ?? { baseMinor: null, perItemMinor: 0, freeOverMinor: null });
}

/**
 * A part with everything that its page shows, and how it fits what is asked for.
 *
 * Errors: `not-found` for a draft or hidden part, or one of a workshop that is not admitted; else as `readNeed`.
 */
export async function partPage(partId: string, query: NeedQuery): Promise<z.input<typeof PartPage>> {
  const { part, workshop } = await shownPart(partId);
  const { need, fit, familyId } = await bestFit(part, query);
  const [parts, photos, fitClaims, evidence, landed] = await Promise.all([
    presentParts([partId]),
    Photo.findAll({ where: { partId }, order: [["position", "ASC"]] }),
    select<FitClaim>(claimsSql, { partId }),
    evidenceOf([partId], familyId),
    landedIn(part, query.shipTo),
  ]);
  const summary = parts.get(partId);
  const reports = evidence.get(partId);
  if (!summary || !reports) throw new AppError("not-found");
  return {
    part: part.state === "retired" ? { ...summary, available: 0 } : summary,
    description: part.description,
    workshop: presentWorkshop(workshop),
    trader: presentTrader(workshop),
    photos: photos.map((photo) => presentPhoto(photo, 960)),
    fitClaims,
    evidence: reports,
    need,
    fit,
    ...landed,
    currency: part.currency,
    madeToSize: part.madeToSize,
  };
}
