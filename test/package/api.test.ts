import { describe, expect, it } from "vitest";
import { textOf } from "../_source.js";
import { apiReport } from "./_api.js";
import { PUBLIC_NAMES } from "./_names.js";

describe("the public interface", () => {
  it("is the committed one: a changed signature is seen (npm run api accepts it)", () => {
    expect(apiReport()).toBe(textOf("test/package/api.txt"));
  });

  it("is reported whole, with types and without comments", () => {
    const report = apiReport();
    for (const { values, types } of Object.values(PUBLIC_NAMES))
      for (const name of [...Object.keys(values), ...types])
        expect(report).toMatch(new RegExp(`^(?:function|const|interface|type) ${name}\\b`, "m"));
    expect(report).toContain(
      "function refractiveIndexCiddor(wavelengthNm: Nanometres, air: MoistAir): Dimensionless;",
    );
    expect(report).not.toContain("/**");
  });
});
