import type {
  AreaUnit,
  BoardPriceModel,
  BoardShape,
  FreightTerm,
  LineMark,
  PartClass,
  PriceModel,
  RailSides,
  Role,
  Separation,
  SmallOrderTerm,
  TaxStated,
  ValueUnit,
} from "#src/shapes/limits.ts";

/** The shapes in which the demonstration is written down; `load.ts` turns them into rows. All of it is invented. */

export interface SeedPerson {
  key: string;
  name: string;
  email: string;
  role: Role;
  /** Kits a co-builder was asked to. */
  asked?: readonly string[];
}

export interface SeedSupplier {
  name: string;
  currency: string;
  freight: FreightTerm;
  freightAmount?: string;
  freeFreightFrom?: string;
  handlingFee?: string;
  minimumOrderValue?: string;
  smallOrder?: SmallOrderTerm;
  smallOrderFee?: string;
  leadTimeDays: number | null;
  note: string;
}

export interface SeedOffer {
  supplier: string;
  code: string;
  /** "100:0.118 500:0.094": from quantity, price each (per lot for lots). */
  breaks: string;
  model?: PriceModel;
  minimum?: number;
  multiple?: number;
  /** Absent: the supplier shows none. */
  stock?: number;
  leadTimeDays?: number;
  /** Days since the price was seen. */
  age: number;
  /** Days for which it still holds; negative: it has ended. */
  validFor?: number;
}

export interface SeedPart {
  /** For naming the same part in several kits. */
  key: string;
  class: PartClass;
  name: string;
  spec: string;
  value?: string;
  unit?: ValueUnit;
  tolerance?: string;
  power?: string;
  voltage?: string;
  package: string;
  holeSpacing?: string;
  drawer: string;
  freeStock?: number;
  stockCost?: string;
  offers: readonly SeedOffer[];
}

export interface SeedLine {
  designators: string;
  part: string;
  mark?: LineMark;
  /** Pieces in one kit of each edition, in the kit's order of editions. */
  perKit: readonly number[];
  /** Order code of the offer that is fixed. */
  pinned?: string;
  /** Only offers whose stock covers it. */
  onlyFromStock?: true;
  note?: string;
}

/** What a board house makes panels like, in millimetres: "250 × 200". */
export interface SeedPanels {
  boardHouse: string;
  largest: string;
  least?: string;
  separation: Separation;
  gap: string;
  railSides: RailSides;
  railWidth: string;
}

export interface SeedQuote {
  boardHouse: string;
  currency: string;
  /** Absent: single boards. `size` of the panel in millimetres: "238 × 144". */
  panel?: { boards: number; size: string; depanelling: string };
  model: BoardPriceModel;
  /** Empty for a formula. */
  breaks: string;
  formula?: { setUp: string; areaRate: string; areaUnit: AreaUnit; perBoard: string };
  engineeringCharge?: string;
  stencilCharge?: string;
  freight: string | null;
  leadTimeDays: number;
  layers: number;
  finish: string;
  colour: string;
  age: number;
  note?: string;
  chosen?: true;
}

export interface SeedChannel {
  name: string;
  weight: number;
  /** By name; absent: every edition. */
  editions?: readonly string[];
  discount?: string;
  /** By name of edition. */
  ownPrices?: Readonly<Record<string, string>>;
  taxRate: string | null;
  taxStated?: TaxStated;
  feeRate: string | null;
  feeFixed: string | null;
  postageCharged: string | null;
  postagePaid: string | null;
  packingCost: string | null;
  other?: { name: string; amount: string; sharedOver: number };
  minutesPerOrder: string | null;
  kitsPerOrder?: string;
}

export interface SeedKit {
  name: string;
  summary: string;
  /** Number of the revision: 3 is C. */
  revision: number;
  board: { shape: BoardShape; width: string; height: string } | null;
  editions: readonly { name: string; weight: number; boardsPerKit: number; price: string | null }[];
  lines: readonly SeedLine[];
  quotes: readonly SeedQuote[];
  panels?: readonly SeedPanels[];
  run: {
    kits: number;
    sweepTo: number;
    spareRate: string;
    boardYield: string;
    boardConfidence: string;
    learningSlope: string;
    kitsMadeBefore: number;
    replacementShare: string;
    replacementCost: string | null;
  };
  tasks: readonly {
    name: string;
    minutesPerKit: string;
    setUpMinutes: string;
    editions?: readonly string[];
  }[];
  packing: readonly { name: string; costPerKit: string | null; editions?: readonly string[] }[];
  charges: readonly { name: string; amount: string; spreadOver?: number }[];
  channels: readonly SeedChannel[];
}
