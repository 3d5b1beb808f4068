/** Starts a worker written in TypeScript: workers do not inherit what lets Node read it. */
import { workerData } from "node:worker_threads";
import { register } from "tsx/esm/api";

register();
await import(workerData.file);
