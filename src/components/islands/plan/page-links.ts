import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import type { NeedCode, SourcePage } from "#src/costing/problem.ts";

const PAGES: Record<SourcePage, { label: string; path: string }> = {
  parts: { label: "Parts", path: "/parts" },
  offers: { label: "Offers", path: "/offers" },
  boards: { label: "Boards", path: "/boards" },
  run: { label: "Run", path: "/run#inputs" },
  price: { label: "Price", path: "/price" },
};

/** A page of the kit as a source: its name and its address. */
export function pageLink(address: KitAddress, page: SourcePage): { label: string; href: string } {
  const { label, path } = PAGES[page];
  return { label, href: kitPath(address, path) };
}

/** Where a missing thing is entered; currency rates belong to the workshop. */
export function needLink(address: KitAddress, need: { code: NeedCode; page: SourcePage }): string {
  return need.code === "no-rate"
    ? `/workshops/${address.workshop}/suppliers#rates`
    : pageLink(address, need.page).href;
}

/** Where the terms of a channel are entered; the page opens them. */
export function channelLink(address: KitAddress, channel: string): string {
  return kitPath(address, `/price#channel-${channel}`);
}
