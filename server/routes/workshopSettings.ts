import { WorkshopSettings, WorkshopSettingsPage } from "#shared/schemas/workshopSettings";
import { marketCurrency } from "../basket/marketCurrency";
import { saveWorkshopSettings } from "../commands/saveWorkshopSettings";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { Workshop } from "../models/Workshop";
import { ownWorkshopId } from "../policies/ownWorkshopId";
import { presentWorkshopSettings } from "../presenters/presentWorkshopSettings";

const common = {
  path: "/workshop/settings",
  tag: "Own workshop",
  access: ["workshop"],
  answer: WorkshopSettingsPage,
} as const;

const present = async (workshop: Workshop): Promise<WorkshopSettingsPage> => {
  const { slug, name, state } = workshop;
  return {
    workshop: { slug, name, state },
    currency: marketCurrency,
    settings: await presentWorkshopSettings(workshop),
  };
};

export function workshopSettingsRoutes(): Endpoint[] {
  return [
    endpoint(
      { ...common, method: "get", summary: "What your workshop says of itself, and asks for postage and tax." },
      async ({ actor }) => {
        const workshop = await Workshop.findByPk(ownWorkshopId(actor));
        if (!workshop) throw new AppError("not-found");
        return present(workshop);
      },
    ),
    endpoint(
      {
        ...common,
        method: "put",
        summary: "Keeps the settings whole; 409 where they were changed since the version that is sent along.",
        body: WorkshopSettings,
      },
      async ({ actor, body, now }) => present(await saveWorkshopSettings(actor, body, now)),
    ),
  ];
}
