import type { Transaction } from "sequelize";
import sharp from "sharp";
import type { DimensionName } from "#shared/domain/partKinds";
import { drawDemoPhoto } from "#shared/drawing/photo";
import { type PhotoStore, photoWidths } from "../adapters/PhotoStore";
import { Photo } from "../models/Photo";
import { dice, idOf } from "./dice";
import type { SeededPart } from "./seedListings";

const size = { width: 960, height: 720 };
const atOnce = 4;

async function drawInto(store: PhotoStore, file: string, svg: string): Promise<void> {
  const picture = await sharp(Buffer.from(svg))
    .resize(size.width, size.height, { fit: "cover" })
    .raw()
    .toBuffer({ resolveWithObject: true });
  for (const width of photoWidths) {
    const content = await sharp(picture.data, { raw: picture.info })
      .resize({ width })
      .webp({ quality: 72, effort: 1 })
      .toBuffer();
    await store.write(`${file}-${width}.webp`, content);
  }
}

/** A picture of each part, drawn by the program itself from the part's own sizes. */
export async function seedPhotos(
  parts: readonly SeededPart[],
  store: PhotoStore,
  transaction: Transaction,
): Promise<void> {
  const queue = [...parts];
  const draw = async () => {
    for (let part = queue.shift(); part; part = queue.shift()) {
      const dims = Object.fromEntries(
        Object.entries(part.sizes).map(([name, { nominalMm }]) => [name, { nominalMm }]),
      ) as Partial<Record<DimensionName, { nominalMm: number }>>;
      const seed = Math.floor(dice(part.id, "photo") * 1e6);
      const file = `demo-${part.id}`;
      await drawInto(
        store,
        file,
        drawDemoPhoto({
          kind: part.kind,
          dims,
          material: part.material,
          seed,
          angle: dice(part.id, "angle") * 24 - 12,
        }),
      );
    }
  };
  await Promise.all(Array.from({ length: atOnce }, draw));
  await Photo.bulkCreate(
    parts.map((part) => ({
      id: idOf(part.id, "photo"),
      partId: part.id,
      position: 1,
      file: `demo-${part.id}`,
      alt: `The part on bench paper beside a steel rule`,
      ...size,
    })),
    { transaction },
  );
}
