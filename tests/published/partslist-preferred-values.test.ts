import { describe, expect, it } from "vitest";
import { isPreferred, nearestPreferred, preferredHint, SERIES } from "#src/partslist/preferred-values.ts";

/**
 * IEC 60063:2015, tables 1 and 2, as in the table of the Python package eseries (eseries/eseries.py, snapshot of
 * 17 December 2023), checked cell by cell against three more public tables.
 */
const PUBLISHED: Readonly<Record<keyof typeof SERIES, string>> = {
  E3: "10 22 47",
  E6: "10 15 22 33 47 68",
  E12: "10 12 15 18 22 27 33 39 47 56 68 82",
  E24: "10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91",
  E48: "100 105 110 115 121 127 133 140 147 154 162 169 178 187 196 205 215 226 237 249 261 274 287 301 316 332 348 365 383 402 422 442 464 487 511 536 562 590 619 649 681 715 750 787 825 866 909 953",
  E96: "100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165 169 174 178 182 187 191 196 200 205 210 215 221 226 232 237 243 249 255 261 267 274 280 287 294 301 309 316 324 332 340 348 357 365 374 383 392 402 412 422 432 442 453 464 475 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768 787 806 825 845 866 887 909 931 953 976",
  E192: "100 101 102 104 105 106 107 109 110 111 113 114 115 117 118 120 121 123 124 126 127 129 130 132 133 135 137 138 140 142 143 145 147 149 150 152 154 156 158 160 162 164 165 167 169 172 174 176 178 180 182 184 187 189 191 193 196 198 200 203 205 208 210 213 215 218 221 223 226 229 232 234 237 240 243 246 249 252 255 258 261 264 267 271 274 277 280 284 287 291 294 298 301 305 309 312 316 320 324 328 332 336 340 344 348 352 357 361 365 370 374 379 383 388 392 397 402 407 412 417 422 427 432 437 442 448 453 459 464 470 475 481 487 493 499 505 511 517 523 530 536 542 549 556 562 569 576 583 590 597 604 612 619 626 634 642 649 657 665 673 681 690 698 706 715 723 732 741 750 759 768 777 787 796 806 816 825 835 845 856 866 876 887 898 909 920 931 942 953 965 976 988",
};

describe("preferred numbers, IEC 60063:2015", () => {
  it.each(Object.entries(PUBLISHED))("%s", (name, values) =>
    expect(SERIES[name as keyof typeof SERIES]).toEqual(values.split(" ")),
  );

  it("nest: every second value of a series is the next coarser one (E24 and E48 belong to different tables)", () => {
    const half = (values: readonly string[]) => values.filter((_, at) => at % 2 === 0);
    expect(half(SERIES.E6)).toEqual(SERIES.E3);
    expect(half(SERIES.E12)).toEqual(SERIES.E6);
    expect(half(SERIES.E24)).toEqual(SERIES.E12);
    expect(half(SERIES.E96)).toEqual(SERIES.E48);
    expect(half(SERIES.E192)).toEqual(SERIES.E96);
  });

  it("holds 298 in E192, where a public table in circulation prints 297", () => {
    expect(SERIES.E192).toContain("298");
    expect(SERIES.E192).not.toContain("297");
  });

  // eseries 1.2.0, package documentation, "Python interface" examples.
  it("nearest of E24 to 319 is 330", () => expect(nearestPreferred("319", "E24")).toBe("330"));

  // Own computation: nearest by difference is 10, nearest by ratio would be 12. We take the difference.
  it("nearest of E12 to 10.97 is 10, by difference", () =>
    expect(nearestPreferred("10.97", "E12")).toBe("10"));

  it("works in any decade and across its ends", () => {
    expect(nearestPreferred("0.00000098", "E24")).toBe("0.000001");
    expect(nearestPreferred("5000", "E24")).toBe("5100");
    expect(isPreferred("4990")).toBe(true);
    expect(preferredHint("670")).toBe("680");
    expect(preferredHint("0")).toBeNull();
  });
});
