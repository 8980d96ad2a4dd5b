import type { PhotoStore } from "../adapters/PhotoStore";
import { database } from "../db/inTransaction";
import { addJob } from "../jobs/addJob";
import { Part } from "../models/Part";
import { Workshop } from "../models/Workshop";
import { writeSearchTexts } from "../search/partSearchText";
import { seedFamilies } from "./seedFamilies";
import { seedKits } from "./seedKits";
import { seedListings } from "./seedListings";
import { seedOrders } from "./seedOrders";
import { seedPeople, workshopId } from "./seedPeople";
import { seedPhotos } from "./seedPhotos";
import { seedReports } from "./seedReports";
import { demoWorkshops } from "./workshopData";

/** Puts the demo data, whole or not at all; false where it is there already. `photos` null leaves them out. */
export async function seedDemo(photos: PhotoStore | null, now: Date): Promise<boolean> {
  const first = demoWorkshops[0];
  if (!first || (await Workshop.findByPk(workshopId(first.slug)))) return false;
  if ((await Part.count()) > 0) throw new Error("This database has listings of its own: demo data is for an empty one");
  await database().transaction(async (transaction) => {
    // Drawing 400 pictures keeps the transaction waiting longer than a request ever may.
    await database().query("SET LOCAL idle_in_transaction_session_timeout = 0", { transaction });
    await seedPeople(transaction, now);
    const points = await seedFamilies(transaction);
    const parts = await seedListings(points, transaction);
    const kits = await seedKits(points, transaction);
    await seedReports(parts, transaction);
    if (photos) await seedPhotos(parts, photos, transaction);
    const partIds = [...parts.map(({ id }) => id), ...kits];
    await writeSearchTexts(partIds, transaction);
    await addJob("indexParts", { partIds }, transaction);
  });
  await database().transaction((transaction) => seedOrders(transaction, now));
  return true;
}
