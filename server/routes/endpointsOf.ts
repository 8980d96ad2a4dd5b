import type { Endpoint } from "../http/endpoint";
import type { Services } from "../Services";
import { addressRoutes } from "./addresses";
import { authRoutes } from "./auth";
import { basketRoutes } from "./basket";
import { checkGaugeRoutes } from "./checkGauges";
import { countryRoutes } from "./countries";
import { driveGaugeRoutes } from "./driveGauges";
import { familyRoutes } from "./families";
import { gaugeRoutes } from "./gauges";
import { orderRoutes } from "./orders";
import { partRoutes } from "./parts";
import { searchRoutes } from "./search";
import { sheetRoutes } from "./sheets";
import { workshopParcelRoutes } from "./workshopParcels";
import { workshopSettingsRoutes } from "./workshopSettings";
import { workshopRoutes } from "./workshops";

/** Every call of the interface. One that is not listed here is neither served nor described. */
export function endpointsOf(services: Services): Endpoint[] {
  return [
    ...authRoutes(services),
    ...searchRoutes(services),
    ...partRoutes(),
    ...familyRoutes(services),
    ...workshopRoutes(),
    ...workshopSettingsRoutes(),
    ...countryRoutes(),
    ...basketRoutes(),
    ...orderRoutes(services),
    ...workshopParcelRoutes(),
    ...addressRoutes(),
    ...gaugeRoutes(),
    ...driveGaugeRoutes(),
    ...checkGaugeRoutes(),
    ...sheetRoutes(),
  ];
}
