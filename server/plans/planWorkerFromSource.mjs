// Tests and the bench run from source: a thread of Node 20 reads TypeScript only after this.
import { register } from "tsx/esm/api";

register();
await import("./planWorker.ts");
