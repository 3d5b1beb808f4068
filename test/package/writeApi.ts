/** Writes the report of the public interface: npm run api. */
import { writeFileSync } from "node:fs";
import { ROOT } from "../_source.js";
import { apiReport } from "./_api.js";

writeFileSync(`${ROOT}test/package/api.txt`, apiReport());
