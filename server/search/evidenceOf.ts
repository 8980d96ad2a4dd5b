import type { Evidence } from "#shared/schemas/part";
import { select } from "../db/select";

type Row = {
  partId: string;
  fitted: number;
  fittedAfterWork: number;
  didNotFit: number;
  /** Restorers who fitted it, with or without work, at all and to the family asked for. */
  fitters: number;
  fittersHere: number;
};

const sql = `
  SELECT r.part_id AS "partId",
    count(*) FILTER (WHERE r.outcome = 'fitted')::integer AS fitted,
    count(*) FILTER (WHERE r.outcome = 'fitted-after-work')::integer AS "fittedAfterWork",
    count(*) FILTER (WHERE r.outcome = 'did-not-fit')::integer AS "didNotFit",
    count(DISTINCT r.user_id) FILTER (WHERE r.outcome <> 'did-not-fit')::integer AS fitters,
    count(DISTINCT r.user_id) FILTER (WHERE r.outcome <> 'did-not-fit' AND s.family_id = $familyId::uuid)::integer
      AS "fittersHere"
  FROM fit_reports r LEFT JOIN service_points s ON s.id = r.service_point_id
  WHERE r.part_id = ANY($partIds::uuid[])
  GROUP BY r.part_id`;

const people = (count: number) => (count === 1 ? "1 restorer" : `${count} restorers`);

/** What restorers reported of a part, in one sentence without a full stop. */
function sentence({ fitters, fittersHere, fittedAfterWork, didNotFit }: Row): string {
  const failed = didNotFit > 0 ? `${people(didNotFit)} found that it did not fit` : "";
  if (fitters === 0) return failed;
  const where = fittersHere > 0 ? " to the same family" : "";
  const work = fittedAfterWork > 0 ? `, ${fittedAfterWork} after some work` : "";
  // What was done to other families is not counted where the same family is named, so its work is not told there either.
  const fitted = `${people(fittersHere || fitters)} fitted this${where}${fittersHere > 0 ? "" : work}`;
  return failed ? `${fitted}; ${failed}` : fitted;
}

/** Evidence from fit reports for each of these parts; `familyId` is the family asked for, if any. */
export async function evidenceOf(partIds: readonly string[], familyId: string | null): Promise<Map<string, Evidence>> {
  const none = { fitted: 0, fittedAfterWork: 0, didNotFit: 0, sentence: "no fit reports yet" };
  const evidence = new Map<string, Evidence>(partIds.map((id) => [id, none]));
  if (partIds.length === 0) return evidence;
  for (const row of await select<Row>(sql, { partIds, familyId })) {
    const { partId, fitted, fittedAfterWork, didNotFit } = row;
    evidence.set(partId, { fitted, fittedAfterWork, didNotFit, sentence: sentence(row) });
  }
  return evidence;
}
