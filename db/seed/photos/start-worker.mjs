// Hooks that read TypeScript do not reach into a worker thread from the thread that started it (Node 20, tsx 4): the thread sets them up.
import { register } from "tsx/esm/api";

register();
await import("./render-worker.ts");
