import type { SeedChannel } from "./seed-data.ts";

/** Where the kits of Marsh Lane Workshop are sold and what that takes. Invented, as are the rates. */

/** Inside every price of the demonstration. */
export const TAX = "0.21";

const SITE = {
  name: "Own site",
  weight: 1,
  taxRate: TAX,
  feeRate: "0.015",
  feeFixed: "0.25",
  postageCharged: "4.95",
  postagePaid: "4.10",
  packingCost: "0.95",
  minutesPerOrder: "9",
} satisfies SeedChannel;

const MARKETPLACE = {
  ...SITE,
  name: "Marketplace",
  feeRate: "0.09",
  feeFixed: "0.50",
  minutesPerOrder: "7",
} satisfies SeedChannel;

/** Nobody has said yet what a sale takes. */
export const UNDECIDED: SeedChannel = {
  name: "Own site",
  weight: 1,
  taxRate: null,
  feeRate: null,
  feeFixed: null,
  postageCharged: null,
  postagePaid: null,
  packingCost: null,
  minutesPerOrder: null,
};

export const DEW_LANTERN_CHANNELS: readonly SeedChannel[] = [
  { ...SITE, weight: 55 },
  {
    ...MARKETPLACE,
    weight: 20,
    ownPrices: { "Board and disc": "15.00", "Full kit": "36.00", "Built and tested": "62.00" },
  },
  {
    name: "Club stall",
    weight: 15,
    taxRate: TAX,
    feeRate: "0.0175",
    feeFixed: "0",
    postageCharged: "0",
    postagePaid: "0",
    packingCost: "0",
    other: { name: "Stall hire", amount: "45.00", sharedOver: 25 },
    minutesPerOrder: "16",
  },
  {
    name: "Wholesale",
    weight: 10,
    editions: ["Full kit"],
    ownPrices: { "Full kit": "20.50" },
    taxRate: TAX,
    taxStated: "on-top",
    feeRate: "0",
    feeFixed: "0",
    postageCharged: "0",
    postagePaid: "1.07",
    packingCost: "0",
    minutesPerOrder: "3",
  },
];

export const BENCH_PIP_CHANNELS: readonly SeedChannel[] = [
  {
    ...SITE,
    weight: 3,
    postageCharged: "3.90",
    postagePaid: "3.10",
    packingCost: "0.60",
    minutesPerOrder: "6",
  },
  {
    ...MARKETPLACE,
    weight: 1,
    discount: "-0.06",
    postageCharged: "3.90",
    postagePaid: "3.10",
    packingCost: "0.60",
    minutesPerOrder: "5",
  },
];

export const CRICKET_BOX_CHANNELS: readonly SeedChannel[] = [
  { ...SITE, postageCharged: "4.90", postagePaid: "4.20", minutesPerOrder: "8" },
];
