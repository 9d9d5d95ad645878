import { type KitAddress, kitPath } from "#src/components/islands/kit-address.ts";
import type { Place, SourcePage } from "#src/costing/problem.ts";
import { channelLink, pageLink } from "./page-links.ts";

/** The way to where a thing of a kit is settled: suppliers and rates belong to the workshop. */
export function thingLink(
  address: KitAddress,
  { page, at }: { page: SourcePage; at: Place },
): { label: string; href: string } {
  const suppliers = `/workshops/${address.workshop}/suppliers`;
  if (page === "offers" && at.part)
    return { label: "Look at the offers", href: kitPath(address, `/offers/${at.part}`) };
  if (page === "offers" && at.supplier)
    return { label: "Look at the terms", href: `${suppliers}/${at.supplier}` };
  if (at.currency) return { label: "Set the rate", href: `${suppliers}#rates` };
  if (at.channel) return { label: "Look at the channel", href: channelLink(address, at.channel) };
  const { label, href } = pageLink(address, page);
  return { label: `Go to ${label}`, href };
}
