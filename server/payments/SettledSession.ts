import { z } from "zod";

/** What we rely on in a checkout session of the provider; everything else in it may be anything. */
export const SettledSession = z.object({
  id: z.string(),
  client_reference_id: z.uuid(),
  amount_total: z.int(),
  currency: z.string(),
  payment_status: z.string(),
  payment_intent: z
    .union([z.string(), z.object({ id: z.string() }).transform(({ id }) => id)])
    .nullable()
    .default(null),
});
export type SettledSession = z.infer<typeof SettledSession>;
