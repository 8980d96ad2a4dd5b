import { inject } from "vitest";
import { copyTemplate } from "./templateDatabase";

/** A migrated, empty database for one test file. `drop` ends whatever is still connected to it. */
export function createTestDatabase(): Promise<{ url: string; drop: () => Promise<void> }> {
  const { serverUrl, template } = inject("migratedDatabase");
  return copyTemplate(serverUrl, template);
}
