import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { backPath } from "#src/server/back-path.ts";

describe("where to go on after signing in", () => {
  it.each(["/", "/account", "/workshops/a1/kits/b2/run?run=40#even", "/invitation?token=abc"])(
    "is %s where that is a page of ours",
    (path) => expect(backPath(path)).toBe(path),
  );

  it.each([
    null,
    undefined,
    "",
    "account",
    "https://elsewhere.example/",
    "//elsewhere.example",
    "/\\elsewhere.example",
    "/\t/elsewhere.example",
    "/..//elsewhere.example",
    "/api/sign-out",
    "/./api/sign-out",
    "javascript:alert(1)",
  ])("is the start for %j", (path) => expect(backPath(path)).toBe("/"));

  it("never leads to another site, whatever it is given", () => {
    const pieces = fc.constantFrom(
      "/",
      "\\",
      "..",
      ".",
      "@",
      ":",
      "elsewhere.example",
      "\t",
      "\n",
      "?",
      "#",
      "%2f",
    );
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 12 }), (parts) => {
        const site = "http://127.0.0.1:4321";
        expect(new URL(backPath(`/${parts.join("")}`), site).origin).toBe(site);
      }),
    );
  });
});
