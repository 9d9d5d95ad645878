/** Closed lists and limits, each stated once: Zod shapes, table CHECKs, input lengths and tests read them here. */

export const ROLES = ["owner", "designer", "seller", "co-builder"] as const;
export type Role = (typeof ROLES)[number];

/** Part classes; the properties that matter per class follow with the substitution rules. */
export const PART_CLASSES = [
  "resistor",
  "capacitor",
  "inductor",
  "led",
  "diode",
  "transistor",
  "integrated-circuit",
  "crystal",
  "switch",
  "connector",
  "potentiometer",
  "battery-holder",
  "mechanical",
  "board",
  "other",
] as const;
export type PartClass = (typeof PART_CLASSES)[number];

/** How a line of the list counts: bought for every kit, chosen per edition, brought by the builder, or left off. */
export const LINE_MARKS = ["in-kit", "option", "builders-own", "do-not-place"] as const;
export type LineMark = (typeof LINE_MARKS)[number];

/** COSTING 3: whole order at the break reached, each slice at its own price, or fixed lots at a total price. */
export const PRICE_MODELS = ["whole-order", "by-slice", "lots"] as const;
export type PriceModel = (typeof PRICE_MODELS)[number];

/** How a board house prices boards or panels: fixed lots at a total price, each at the break reached, or by formula. */
export const BOARD_PRICE_MODELS = ["lots", "whole-order", "formula"] as const;
export type BoardPriceModel = (typeof BOARD_PRICE_MODELS)[number];

export const BOARD_SHAPES = ["rectangle", "round"] as const;
export type BoardShape = (typeof BOARD_SHAPES)[number];

/** How the boards of a panel are parted: scored from edge to edge, or routed but for breaking tabs. */
export const SEPARATIONS = ["v-score", "routed"] as const;
export type Separation = (typeof SEPARATIONS)[number];

/** Which sides of a board house's largest panel carry a rail. */
export const RAIL_SIDES = ["none", "long", "short", "all"] as const;
export type RailSides = (typeof RAIL_SIDES)[number];

/** What a board house's area rate is for. */
export const AREA_UNITS = ["dm2", "m2"] as const;
export type AreaUnit = (typeof AREA_UNITS)[number];

/** Millimetres: a panel's side, and the least side of a board on one. Beyond both, a slip of the pen. */
export const PANEL_SIDE_MOST = 2000;
export const PANEL_BOARD_LEAST = 1;
export const BOARDS_PER_PANEL_MOST = 2000;

/** SI units a part's value may have. */
export const VALUE_UNITS = ["ohm", "F", "H", "Hz", "V", "A", "m"] as const;
export type ValueUnit = (typeof VALUE_UNITS)[number];

export const FREIGHT_TERMS = ["none", "flat", "not-known"] as const;
export type FreightTerm = (typeof FREIGHT_TERMS)[number];

/** What a supplier does below its minimum order value. */
export const SMALL_ORDER_TERMS = ["none", "fee", "refused"] as const;
export type SmallOrderTerm = (typeof SMALL_ORDER_TERMS)[number];

/** Whether a channel's prices have their tax inside, or are stated without it. */
export const TAX_STATED = ["inside", "on-top"] as const;
export type TaxStated = (typeof TAX_STATED)[number];

/** What a kit's first channel is called. */
export const OWN_SITE = "Own site";

export const IMPORT_KINDS = ["parts-list", "price-list"] as const;
export type ImportKind = (typeof IMPORT_KINDS)[number];

/** A draft can be left and come back to; a taken list can be taken back. */
export const IMPORT_STATES = ["draft", "taken", "taken-back", "dropped"] as const;
export type ImportState = (typeof IMPORT_STATES)[number];

export const ONE_TIME_PURPOSES = ["confirm-email", "reset-password", "sign-in"] as const;
export type OneTimePurpose = (typeof ONE_TIME_PURPOSES)[number];

/** Decimal text limits: digits before and after the point. */
export const MONEY_WHOLE_DIGITS = 12;
export const UNIT_PRICE_PLACES = 6;

export const RUN_LEAST = 1;
export const RUN_MOST = 1000;
/** The ruler of the tally strip runs between these; a run outside them can be typed. */
export const RULER_LEAST = 10;
export const RULER_MOST = 500;

export const PARTS_MOST = 2000;
export const OFFERS_PER_PART_MOST = 40;
export const BREAKS_PER_OFFER_MOST = 24;
export const EDITIONS_MOST = 8;
export const CHANNELS_MOST = 12;
export const SUPPLIERS_MOST = 200;
export const BOARD_QUOTES_MOST = 50;
export const QUANTITY_MOST = 1_000_000_000;
export const QUANTITY_PER_KIT_MOST = 10_000;

/** A price older than this is worth asking for again before money is spent. Common practice, no source. */
export const OLD_PRICE_DAYS = 30;

export const NAME_LENGTH = 120;
export const TEXT_LENGTH = 2000;
export const EMAIL_LENGTH = 254;
export const PASSWORD_LEAST = 12;
export const PASSWORD_MOST = 256;
export const PASSWORD_DIFFERENT_LEAST = 5;
export const TOKEN_DAYS_MOST = 366;
export const TOKENS_MOST = 50;

/** A day of reference rates takes 2 kB; a file of many years 10 MB, and only its newest day is read. */
export const RATES_FILE_BYTES = 1024 * 1024;
export const UPLOAD_BYTES = 5 * 1024 * 1024;
/** Pasted cells travel as JSON, which escapes tabs and line ends. */
export const PASTED_BYTES = 2 * UPLOAD_BYTES;
export const UPLOAD_ROWS = 20_000;
export const UPLOAD_COLUMNS = 200;
/** A workbook is an archive: what it holds may be ten times what is sent. */
export const WORKBOOK_BYTES = 10 * UPLOAD_BYTES;
export const JSON_BYTES = 256 * 1024;
/** A change of a long parts list at once, such as a pasted block. */
export const LIST_CHANGE_BYTES = 4 * 1024 * 1024;
export const PLAN_BYTES = 8 * 1024 * 1024;
