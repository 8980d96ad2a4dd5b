import { mkdir, rename, writeFile } from "node:fs/promises";
import { join } from "node:path";

/** Widths that every photo is kept at. */
export const photoWidths = [320, 960] as const;

/** Keeps pictures in a folder under names that the program made; serving them is `server/http/photos.ts`. */
export class PhotoStore {
  readonly folder: string;

  constructor(dataDir: string) {
    this.folder = join(dataDir, "photos");
  }

  /** Writes whole or not at all. `name` is one that we made: letters, digits, hyphens and a dot. */
  async write(name: string, content: Buffer): Promise<void> {
    if (!/^[a-z0-9-]+\.(webp|jpg)$/.test(name)) throw new Error(`not a photo name: ${name}`);
    await mkdir(this.folder, { recursive: true });
    const partial = join(this.folder, `${name}.part`);
    await writeFile(partial, content);
    await rename(partial, join(this.folder, name));
  }
}

/** Where a page finds a photo at one of its widths. */
export const photoUrl = (file: string, width: (typeof photoWidths)[number]): string => `/photos/${file}-${width}.webp`;
