import { checkIn } from "#shared/domain/checkIn";
import { robustMean } from "#shared/domain/robustMean";
import { BasketPlanAnswer, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";
import { CheckInAnswer, CheckInRequest, ConsensusAnswer, ConsensusRequest } from "#shared/schemas/gauges/checks";
import type { Endpoint } from "../http/endpoint";
import { gauge } from "../http/gauge";
import { planBasket } from "../plans/planBasket";

/** What the gauge desk says of deliveries, of many people's measurements, and of a basket. */
export function checkGaugeRoutes(): Endpoint[] {
  return [
    gauge(
      {
        method: "post",
        path: "/check-in",
        summary: "Whether a delivered size is within what was stated, or whether that cannot be told (ISO 14253-1).",
        takes: CheckInRequest,
        answer: CheckInAnswer,
      },
      checkIn,
    ),
    gauge(
      {
        method: "post",
        path: "/consensus",
        summary: "One size from independent measurements, hardly moved by wild ones (ISO 13528, Algorithm A).",
        takes: ConsensusRequest,
        answer: ConsensusAnswer,
      },
      ({ valuesMm }) => robustMean(valuesMm),
    ),
    gauge(
      {
        method: "post",
        path: "/basket-plan",
        summary: "The cheapest basket, the fewest parcels, the surest fit and the soonest, each proved the best.",
        takes: BasketPlanRequest,
        answer: BasketPlanAnswer,
      },
      planBasket,
    ),
  ];
}
