import { expect, it } from "vitest";
import { missingThings } from "#src/components/islands/plan/missing-things.ts";
import { thingLink } from "#src/components/islands/plan/thing-link.ts";
import { costRun } from "#src/costing/cost-run.ts";
import { toSettle } from "#src/costing/to-settle.ts";
import { edition, plan } from "#tests/costing/plans.ts";
import { channel } from "#tests/costing/price/channels.ts";

const address = { workshop: "w", kit: "k" };
const made = plan({
  lines: 1,
  editions: [edition({ price: "10" })],
  channels: [channel(), channel({ id: "fair", name: "Spring fair", feeRate: null, postagePaid: null })],
});
const run = costRun(made);

it("names the channel that lacks a term, and leads to its column", () => {
  const things = missingThings(made, run.brings.known ? [] : run.brings.needs, address);
  expect(things.map(({ what, way, noneOfIt }) => [what, way.href, noneOfIt?.row, noneOfIt?.field])).toEqual([
    ["Spring fair", "/workshops/w/kits/k/price#channel-fair", { kind: "channel", id: "fair" }, "feeRate"],
    ["Spring fair", "/workshops/w/kits/k/price#channel-fair", { kind: "channel", id: "fair" }, "postagePaid"],
  ]);
});

it("counts a channel once, whatever it lacks", () => {
  const things = toSettle(made, run).filter(({ page }) => page === "price");
  expect(things.map(({ key, problems }) => [key, problems.length])).toEqual([["fair", 2]]);
  expect(things.map((thing) => thingLink(address, thing).href)).toEqual([
    "/workshops/w/kits/k/price#channel-fair",
  ]);
});
