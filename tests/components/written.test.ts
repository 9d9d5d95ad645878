import { expect, it } from "vitest";
import { count, money, rate, share, signedMoney, unitPrice, wholeMoney } from "#src/components/written.ts";

// DESIGN section 8, "Money".
it("writes money as the design says", () => {
  expect(money("14.947083", "EUR")).toBe("€14.95");
  expect(money("1793.65", "EUR")).toBe("€1\u00a0793.65");
  expect(money("-2.14", "EUR")).toBe("\u2212€2.14");
  expect(money("0.004", "EUR")).toBe("€0.00");
  expect(money("-0.004", "EUR")).toBe("€0.00");
  expect(money("1234567.5", "CHF")).toBe("CHF\u00a01\u00a0234\u00a0567.50");
  expect(money("1234.4", "JPY")).toBe("¥1\u00a0234");
  expect(signedMoney("84.94", "EUR")).toBe("+€84.94");
  expect(wholeMoney("1499.6", "EUR")).toBe("€1\u00a0500");
  expect(unitPrice("0.062", "EUR")).toBe("€0.062");
  expect(unitPrice("0.0043", "EUR")).toBe("€0.0043");
  expect(unitPrice("1.2", "EUR")).toBe("€1.200");
});

it("writes counts, shares and rates", () => {
  expect(count(1000)).toBe("1\u00a0000");
  expect(share("0.4285714")).toBe("43\u00a0%");
  expect(share("1")).toBe("100\u00a0%");
  expect(share("0")).toBe("0\u00a0%");
  expect(rate("0.029")).toBe("2.9\u00a0%");
  expect(rate("0.21")).toBe("21\u00a0%");
  expect(rate("0.00125")).toBe("0.125\u00a0%");
  expect(rate("1.5")).toBe("150\u00a0%");
});
