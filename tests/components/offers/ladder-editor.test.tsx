// @vitest-environment happy-dom
import { act, cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import { CallFailed } from "#src/components/islands/call.ts";
import { blankOffer, OfferForm } from "#src/components/islands/offers/OfferForm.tsx";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { OfferFields } from "#src/shapes/offer.ts";
import { SUPPLIER } from "#tests/support/supply.ts";

afterEach(cleanup);

const LUMENHOF: SupplierView = { ...SUPPLIER, id: "lumenhof", version: 1, offers: 0 };

/** The form with what it would save; `refuse` answers the first save with these errors. */
function form(breaks: OfferFields["breaks"], refuse?: { at: string; message: string }[]) {
  const saved: OfferFields[] = [];
  const answers = refuse ? [refuse] : [];
  render(
    <OfferForm
      first={{ ...blankOffer(LUMENHOF, "2026-03-09"), breaks }}
      version={1}
      suppliers={[LUMENHOF]}
      suppliersHref="/suppliers"
      action="Add the offer"
      onLeave={() => undefined}
      onSave={async (fields) => {
        saved.push(fields);
        const errors = answers.shift();
        if (errors)
          throw new CallFailed({ code: "wrong-input", status: 422, title: "No.", detail: "Look.", errors });
      }}
    />,
  );
  const save = () => act(async () => fireEvent.click(screen.getByRole("button", { name: /^Add the offer/ })));
  return { saved, save };
}

const quantity = (place: number) => screen.getByLabelText(`From, break ${place}`) as HTMLInputElement;
const price = (place: number) => screen.getByLabelText(`Price each, break ${place}`) as HTMLInputElement;

function type(field: HTMLInputElement, text: string) {
  fireEvent.change(field, { target: { value: text } });
  fireEvent.blur(field);
}

describe("the ladder of an offer", () => {
  it("begins with one empty break, and grows", async () => {
    const { saved, save } = form([]);
    type(quantity(1), "1 00");
    type(price(1), "0,118");
    fireEvent.click(screen.getByRole("button", { name: "Add a break" }));
    await waitFor(() => expect(document.activeElement).toBe(quantity(2)));
    type(quantity(2), "500");
    type(price(2), "0.0945");
    await save();
    expect(saved[0]?.breaks).toEqual([
      { quantity: 100, price: "0.118" },
      { quantity: 500, price: "0.0945" },
    ]);
  });

  it("loses a break by its own button, and focus goes to the one before", async () => {
    const { saved, save } = form([
      { quantity: 1, price: "0.30" },
      { quantity: 10, price: "0.20" },
      { quantity: 100, price: "0.10" },
    ]);
    fireEvent.click(screen.getByRole("button", { name: "Remove break 2" }));
    await waitFor(() => expect(document.activeElement).toBe(quantity(1)));
    await save();
    expect(saved[0]?.breaks.map((rung) => rung.quantity)).toEqual([1, 100]);
  });

  it("leaves out empty breaks at the end, so that an offer without a price can be kept", async () => {
    const { saved, save } = form([]);
    await save();
    expect(saved[0]?.breaks).toEqual([]);
  });

  it("cautions about a price that rises, and saves it", async () => {
    const { saved, save } = form([
      { quantity: 10, price: "0.10" },
      { quantity: 100, price: "0.20" },
    ]);
    expect(screen.getByText(/Dearer each than the one before/)).toBeTruthy();
    await save();
    expect(saved).toHaveLength(1);
  });

  it("shows a refusal at the break it is about, with a way there, and keeps what was typed", async () => {
    const message = "The quantity 10 stands twice in the ladder. Each break has its own.";
    const { saved, save } = form(
      [
        { quantity: 10, price: "0.20" },
        { quantity: 10, price: "0.10" },
      ],
      [{ at: "breaks.1.quantity", message }],
    );
    await save();
    expect(quantity(2).getAttribute("aria-invalid")).toBe("true");
    expect(quantity(1).getAttribute("aria-invalid")).toBeNull();
    fireEvent.click(screen.getByRole("link", { name: `Row 2: ${message}` }));
    expect(document.activeElement).toBe(quantity(2));
    type(quantity(2), "100");
    await save();
    expect(saved[1]?.breaks.map((rung) => rung.quantity)).toEqual([10, 100]);
  });

  it("is not sent while a price cannot be read", async () => {
    const { saved, save } = form([{ quantity: 10, price: "0.20" }]);
    type(price(1), "twenty");
    await save();
    expect(saved).toEqual([]);
    expect(document.activeElement).toBe(price(1));
  });
});
