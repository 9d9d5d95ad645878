import { CallFailed, call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { noteEdit } from "#src/components/islands/plan/edit-log.ts";
import { heldPlan, holdPlan } from "#src/components/islands/plan/save-edits.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/choices/[part].ts";
import type { PlanPart } from "#src/shapes/plan.ts";
import { heldOffers, holdOffers, offersSaved } from "./offers-store.ts";

/** What a kit may choose about buying one part here. */
export type Choice = Partial<Pick<PlanPart, "pinnedOffer" | "onlyFromStock">>;

function sent({ pinnedOffer, onlyFromStock }: Choice) {
  return {
    ...(pinnedOffer !== undefined && { pinnedOfferId: pinnedOffer }),
    ...(onlyFromStock !== undefined && { onlyFromStock }),
  };
}

function show(address: KitAddress, part: string, choice: Choice): void {
  holdPlan(address, (held) => ({
    ...held,
    plan: {
      ...held.plan,
      parts: held.plan.parts.map((one) => (one.id === part ? { ...one, ...choice } : one)),
    },
  }));
}

/**
 * Chooses how the kit buys a part: shown and worked out at once, then saved. `name` is what the edit is called
 * in the strip: "Line 14: from Ebbing."
 */
export async function chooseFor(
  address: KitAddress,
  part: string,
  choice: Choice,
  name: string,
): Promise<void> {
  const before = heldPlan(address);
  const was = before?.plan.parts.find(({ id }) => id === part);
  const version = heldOffers(address)?.parts.find(({ id }) => id === part)?.choiceVersion;
  if (!before || !was || version === undefined) return;
  const back: Choice = {};
  if (choice.pinnedOffer !== undefined) back.pinnedOffer = was.pinnedOffer;
  if (choice.onlyFromStock !== undefined) back.onlyFromStock = was.onlyFromStock;
  show(address, part, choice);
  noteEdit({
    before,
    from: back,
    at: Date.now(),
    field: `choice ${part} ${Object.keys(choice).join()}`,
    nameFrom: () => name,
    undo: () => void chooseFor(address, part, back, `${name} Taken back.`),
  });
  try {
    const path = kitApi(address, `/choices/${part}`);
    const saved = await call<typeof PATCH>("PATCH", path, { version, set: sent(choice) });
    holdOffers(address, (held) => ({
      ...held,
      parts: held.parts.map((one) => (one.id === part ? { ...one, choiceVersion: saved.version } : one)),
    }));
    offersSaved(address);
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    refused(address, part, back, error);
  }
}

function refused(address: KitAddress, part: string, back: Choice, { problem }: CallFailed): void {
  show(address, part, back);
  const text =
    problem.code === "changed-meanwhile"
      ? "Somebody chose for this part in the meantime. Their choice is shown; choose again if you would have another."
      : `Not saved. ${problem.title} ${problem.errors?.[0]?.message ?? problem.detail}`;
  showToast({ kind: "fault", text });
  void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
  void queryClient.invalidateQueries({ queryKey: kitKeys.offers(address.kit) });
}
