import type { Endpoint } from "../http/endpoint";
import type { Services } from "../Services";
import { addressRoutes } from "./addresses";
import { authRoutes } from "./auth";
import { basketRoutes } from "./basket";
import { orderRoutes } from "./orders";

/** Every call of the interface. One that is not listed here is neither served nor described. */
export function endpointsOf(services: Services): Endpoint[] {
  return [...authRoutes(services), ...basketRoutes(), ...orderRoutes(services), ...addressRoutes()];
}
