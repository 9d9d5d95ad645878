import type { BoardQuoteRow } from "#src/server/store/board-quote.ts";
import type { ChannelRow, OwnPrice } from "#src/server/store/channel.ts";
import type { CurrencyRateRow } from "#src/server/store/currency-rate.ts";
import type { EditionRow } from "#src/server/store/edition.ts";
import type { KitRow } from "#src/server/store/kit.ts";
import type { LineRow } from "#src/server/store/line.ts";
import type { OfferBreakRow, OfferRow } from "#src/server/store/offer.ts";
import type { PanelTermsRow } from "#src/server/store/panel-terms.ts";
import type { PartChoiceRow, PartRow } from "#src/server/store/part.ts";
import type { ChargeRow, PackingItemRow, RunPlanRow, TaskRow } from "#src/server/store/run-plan.ts";
import type { SupplierRow } from "#src/server/store/supplier.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";
import type { CurrencyRateInput } from "#src/shapes/currency-rate.ts";
import type { EditionChange } from "#src/shapes/edition.ts";
import type { KitChange } from "#src/shapes/kit.ts";
import type { OfferFields } from "#src/shapes/offer.ts";
import type { PanelTermsFields } from "#src/shapes/panel-terms.ts";
import type { PartFields } from "#src/shapes/part.ts";
import type { PartChoice } from "#src/shapes/part-choice.ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";
import type { SnapshotPart } from "#src/shapes/parts-snapshot.ts";
import type { PlanChannel, PlanCharge, PlanEdition, PlanPacking, PlanTask } from "#src/shapes/plan.ts";
import type { RunChange } from "#src/shapes/run-edit.ts";
import type { SupplierFields } from "#src/shapes/supplier.ts";

/**
 * What a row keeps is what may cross the edge, noun by noun: the type check fails where a column or a field is
 * renamed, added, or changes what it may hold. Ids, versions and places are the server's own.
 */

type Flat<T> = { [Key in keyof T]: T[Key] };
type Same<A, B> =
  (<T>() => T extends Flat<A> ? 1 : 2) extends <T>() => T extends Flat<B> ? 1 : 2 ? true : false;
type Proof<Holds extends true> = Holds;

type OwnToServer =
  | "id"
  | "workshopId"
  | "kitId"
  | "partId"
  | "offerId"
  | "position"
  | "version"
  | "createdAt";
/** The columns of a row that people fill in. */
type Filled<Row, Besides extends keyof Row = never> = Omit<Row, OwnToServer | Besides>;
/** The fields of a change, each given. */
type Given<Change, Besides extends PropertyKey = never> = Required<Omit<Change, "version" | Besides>>;

type OtherCost = "otherName" | "otherAmount" | "otherSharedOver";
/** Columns of a part of a shape that is flat in its row. */
type Prefixed<Other> = { [Key in keyof Other & string as `other${Capitalize<Key>}`]: Other[Key] };

type LineSet = Extract<PartsChange, { do: "change-line" }>["set"];

export interface Proofs {
  kit: Proof<Same<Filled<KitRow, "revision" | "boardMarks" | "closedAt">, Given<KitChange, "closed">>>;
  edition: Proof<Same<Filled<EditionRow, "price">, Given<EditionChange>>>;
  price: Proof<Same<EditionRow["price"], PlanEdition["price"]>>;
  line: Proof<Same<Filled<LineRow>, Given<LineSet, "quantities" | "part">>>;
  part: Proof<Same<Filled<PartRow>, Given<PartFields>>>;
  partOfARevision: Proof<
    Same<Omit<PartRow, "workshopId" | "freeStock" | "stockCost" | "createdAt" | "version">, SnapshotPart>
  >;
  choice: Proof<Same<Filled<PartChoiceRow>, Given<PartChoice>>>;
  supplier: Proof<Same<Filled<SupplierRow>, SupplierFields>>;
  offer: Proof<Same<Filled<OfferRow>, Omit<OfferFields, "breaks">>>;
  rung: Proof<Same<Filled<OfferBreakRow>, OfferFields["breaks"][number]>>;
  rate: Proof<Same<Filled<CurrencyRateRow, "currency" | "setAt">, Given<CurrencyRateInput>>>;
  quote: Proof<Same<Filled<BoardQuoteRow>, Omit<BoardQuoteFields, "breaks">>>;
  panelTerms: Proof<Same<Filled<PanelTermsRow>, PanelTermsFields>>;
  run: Proof<Same<Filled<RunPlanRow>, Given<RunChange>>>;
  channel: Proof<Same<Filled<ChannelRow, OtherCost>, Omit<PlanChannel, "id" | "ownPrices" | "other">>>;
  otherCost: Proof<Same<Pick<ChannelRow, OtherCost>, Prefixed<PlanChannel["other"]>>>;
  ownPrice: Proof<Same<OwnPrice, PlanChannel["ownPrices"][number]>>;
  task: Proof<Same<Filled<TaskRow>, Omit<PlanTask, "id">>>;
  packing: Proof<Same<Filled<PackingItemRow>, Omit<PlanPacking, "id">>>;
  charge: Proof<Same<Filled<ChargeRow>, Omit<PlanCharge, "id">>>;
}
