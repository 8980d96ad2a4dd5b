/** One step of the schema, as SQL, and the way back. A landed one is followed by another, never edited. */
export type Migration = { name: string; up: string; down: string };
