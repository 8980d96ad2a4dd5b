import { solveBeltRoute } from "#shared/domain/beltRoute";
import { estimateBeltSample } from "#shared/domain/beltSample";
import { nearestORings } from "#shared/domain/oRings";
import { solveSpeed } from "#shared/domain/speed";
import { strobe } from "#shared/domain/strobe";
import { BeltRouteAnswer, BeltRouteRequest } from "#shared/schemas/gauges/beltRoute";
import { BeltSampleAnswer, BeltSampleRequest } from "#shared/schemas/gauges/beltSample";
import { ORingsAnswer, ORingsRequest } from "#shared/schemas/gauges/oRings";
import { SpeedAnswer, SpeedRequest, StrobeAnswer, StrobeRequest } from "#shared/schemas/gauges/speed";
import type { Endpoint } from "../http/endpoint";
import { gauge } from "../http/gauge";

/** Belts, speeds and rings of the gauge desk. */
export function driveGaugeRoutes(): Endpoint[] {
  return [
    gauge(
      {
        method: "post",
        path: "/belt-route",
        summary: "The belt that runs round pulleys: spans, wraps, length, and the relaxed size for a range of stretch.",
        takes: BeltRouteRequest,
        answer: BeltRouteAnswer,
      },
      (asked) => {
        const route = solveBeltRoute(asked);
        return { ...route, warnings: route.warnings.map(({ words }) => words) };
      },
    ),
    gauge(
      {
        method: "post",
        path: "/belt-sample",
        summary: "From an old belt, however it was measured, to its inside circumference as found and as new.",
        takes: BeltSampleRequest,
        answer: BeltSampleAnswer,
      },
      estimateBeltSample,
    ),
    gauge(
      {
        method: "post",
        path: "/speed",
        summary: "The speed of a drive, its error, which sizes set it, and what the other mains frequency needs.",
        takes: SpeedRequest,
        answer: SpeedAnswer,
      },
      solveSpeed,
    ),
    gauge(
      {
        method: "post",
        path: "/strobe",
        summary: "The ring of bars for a speed, and the speed that it really shows. The lamp flashes twice a cycle.",
        takes: StrobeRequest,
        answer: StrobeAnswer,
      },
      strobe,
    ),
    gauge(
      {
        method: "get",
        path: "/o-rings",
        summary: "The standard O-rings nearest to a size, with their tolerances and stretch (AS568).",
        takes: ORingsRequest,
        answer: ORingsAnswer,
      },
      nearestORings,
    ),
  ];
}
