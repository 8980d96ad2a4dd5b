import type { z } from "zod";
import type { FitClaim, PartPage } from "#shared/schemas/catalogue";
import type { NeedQuery } from "#shared/schemas/need";
import { AppError } from "../errors/AppError";
import { Part } from "../models/Part";
import { Photo } from "../models/Photo";
import { Workshop } from "../models/Workshop";
import { presentFit } from "../presenters/presentFit";
import { presentParts, presentPhoto } from "../presenters/presentParts";
import { presentTrader, presentWorkshop } from "../presenters/presentWorkshop";
import { type Assessed, assessRow, compareFits } from "./assessRow";
import { evidenceOf } from "./evidenceOf";
import { loadItems } from "./loadRows";
import { readNeed } from "./readNeed";
import { select } from "./select";
import { landedOf, loadSellers } from "./sellers";
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
async function bestFit(partId: string, query: NeedQuery, kind: Part["kind"]) {
  const read = await readNeed({ ...query, kind: query.kind ?? (kind === "rebuild-kit" ? undefined : kind) });
  const rows = read.targets.length > 0 ? await loadItems("part", [partId], dimensionsIn(read.targets)) : [];
  const fits = rows.flatMap((row) => assessRow(row, read.targets) ?? []);
  const best: Assessed | undefined = fits.sort((a, b) => compareFits(a.fit, b.fit))[0];
  const severalPoints = new Set(read.targets.map(({ point }) => point?.id)).size > 1;
  return { ...read, fit: best ? presentFit(best.fit, severalPoints ? (best.target.point?.name ?? null) : null) : null };
}

/**
 * A part with everything that its page shows, and how it fits what is asked for.
 *
 * Errors: `not-found` for a draft or hidden part, or one of a workshop that is not admitted; else as `readNeed`.
 */
export async function partPage(partId: string, query: NeedQuery): Promise<z.input<typeof PartPage>> {
  const { part, workshop } = await shownPart(partId);
  const { need, fit, familyId } = await bestFit(partId, query, part.kind);
  const [parts, photos, fitClaims, evidence, sellers] = await Promise.all([
    presentParts([partId]),
    Photo.findAll({ where: { partId }, order: [["position", "ASC"]] }),
    select<FitClaim>(claimsSql, { partId }),
    evidenceOf([partId], familyId),
    loadSellers([workshop.id], query.shipTo),
  ]);
  const summary = parts.get(partId);
  const reports = evidence.get(partId);
  const seller = sellers.get(workshop.id);
  if (!summary || !reports || !seller) throw new AppError("not-found");
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
    ...landedOf(part, seller),
    currency: part.currency,
    madeToSize: part.madeToSize,
  };
}
