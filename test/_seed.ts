/** Property tests draw the same cases at every run; SEED=12345 npm run unit draws others. */
import fc from "fast-check";

fc.configureGlobal({ seed: Number(process.env.SEED ?? 1) });
