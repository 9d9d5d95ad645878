import { describe, expect, it } from "vitest";
import { networkOf } from "#src/server/network-of.ts";

/** Addresses of RFC 3849 and RFC 5737, which are set aside for examples. */
describe("where attempts are counted", () => {
  it.each([
    ["192.0.2.1", "192.0.2.1"],
    ["::ffff:192.0.2.1", "192.0.2.1"],
    ["2001:db8:1:2:3:4:5:6", "2001:db8:1:2::/64"],
    ["2001:0db8:0001:0002:ffff::1", "2001:db8:1:2::/64"],
    ["2001:db8:1:2::", "2001:db8:1:2::/64"],
    ["2001:db8::1", "2001:db8:0:0::/64"],
    ["::1", "0:0:0:0::/64"],
    ["fe80::1%eth0", "fe80:0:0:0::/64"],
    ["", ""],
    ["not an address", "not an address"],
  ])("is for %s: %s", (address, network) => expect(networkOf(address)).toBe(network));

  it("parts neighbouring networks", () => {
    expect(networkOf("2001:db8:1:2::1")).not.toBe(networkOf("2001:db8:1:3::1"));
  });
});
