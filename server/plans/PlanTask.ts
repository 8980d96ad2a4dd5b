import type { BasketPlanAnswer, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";

/** What the planning thread is asked, and its word on it. */
export type PlanTask = { id: number; basket: BasketPlanRequest };
export type PlanWord = { id: number } & (
  | { plan: BasketPlanAnswer }
  | { refusal: { field: string; words: string } }
  | { notProved: string }
);
