import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { applyRemembered, guessColumns, headerFingerprint, mappingOf } from "#src/partslist/columns.ts";
import { breakQuantityOf, currencyOf } from "#src/partslist/headings.ts";

const guess = (text: string) => guessColumns(readCells(text).records);
const meanings = (text: string) => guess(text).columns.map((column) => column.meaning);
const rows = "R1;2;10k;0207\nC1;1;100n;RM5\n";

describe("what the columns mean", () => {
  it.each([
    ["Reference;Quantity;Value;Footprint"],
    ["Bauteil;Menge;Wert;Bauform"],
    ["Repère;Quantité;Valeur;Boîtier"],
    ["Referencia;Cantidad;Valor;Encapsulado"],
    ["Riferimento;Quantità;Valore;Contenitore"],
    ["Referentie;Aantal;Waarde;Behuizing"],
    ["Oznaczenie;Ilość;Wartość;Obudowa"],
    ["Označení;Počet;Hodnota;Pouzdro"],
    ["Referência;Qtde;Valor;Encapsulamento"],
    ["Beteckning;Antal;Värde;Kapsel"],
    ["Обозначение;Кол-во;Номинал;Корпус"],
    ["位号;数量;値;封装"],
    ["REF_DES;QTY.;VALUE;PACKAGE"],
  ])("%s", (heading) =>
    expect(meanings(`${heading}\n${rows}`)).toEqual(["designators", "quantity", "value", "package"]),
  );

  it("lets the cells decide what an ambiguous heading means", () => {
    expect(meanings("Part;Number\nR1,R2;2\nC1;1\nD1,D2,D3;3")).toEqual(["designators", "quantity"]);
    expect(meanings("Part;Number\nScrew M3;10\nBoard;1\nCable;2")).toEqual(["description", "quantity"]);
    expect(meanings("Item;Ref;Type\n1;R1;10k\n2;C1;100n\n3;C2;22p")).toEqual([
      "line-number",
      "designators",
      "value",
    ]);
  });

  it("understands any supplier's part number as an order code of that supplier", () => {
    const found = guess(
      "Ref;Value;Tamsin Part Number;Ebbing#\nR1;10k;T-100;EB-7\nR2;1k;T-101;EB-8",
    ).columns.slice(2);
    expect(found.map(({ meaning, supplier }) => [meaning, supplier])).toEqual([
      ["order-code", "Tamsin"],
      ["order-code", "Ebbing"],
    ]);
  });

  it("takes a column of codes under an unknown name for a supplier's", () =>
    expect(guess("Ref;Value;Tamsin\nR1;10k;T-1003\nR2;1k;T-1004").columns[2]).toMatchObject({
      meaning: "order-code",
      supplier: "Tamsin",
      confidence: "weak",
    }));

  it("knows a quantity by the designators it counts", () =>
    expect(meanings('Ref,Foo,Value\n"R1,R2",2,10k\nR3,1,1k\n"C1,C2,C3",3,1n')[1]).toBe("quantity"));

  it("gives a meaning to one column only, and says why and how surely", () => {
    const { columns } = guess("Value;Value;Ref\n10k;x;R1\n1k;y;R2");
    expect(columns.map((column) => column.meaning)).toEqual(["value", "leave-out", "designators"]);
    expect(columns[2]).toMatchObject({ reason: "heading-and-cells", confidence: "sure" });
  });

  it("finds the heading under a title and without the vocabulary", () => {
    expect(guess("Lantern rev C\n\nRef,Qty\nR1,1\nR2,1").headerRecord).toBe(2);
    expect(guess("foo,bar\nR1,10k\nR2,22k\nC1,1n").headerRecord).toBe(0);
    expect(guess("R1,10k\nR2,22k\nC1,1n").headerRecord).toBeNull();
  });

  it("notes currency and decimal mark", () => {
    const { currency, columns } = guess("Ref;Preis (EUR)\nR1;0,05\nR2;1,20");
    expect(currency).toBe("EUR");
    expect(columns[1]?.decimalMark).toBe("comma");
  });
});

describe("headings", () => {
  it.each([
    ["1+", 1],
    ["100 +", 100],
    ["ab 100", 100],
    ["Preis 10", 10],
    ["Price @ 25", 25],
    ["10 - 99", 10],
    ["from 500", 500],
    ["1000 Stk", 1000],
    ["Price", null],
    ["Lagerbestand", null],
  ])("%s holds from %s", (heading, quantity) => expect(breakQuantityOf(heading)).toBe(quantity));

  it.each([
    ["Price(USD)", "USD"],
    ["0,93 €", "EUR"],
    ["0,05 zł", "PLN"],
    ["Euro", "EUR"],
    ["Europe", null],
  ])("%s is in %s", (text, currency) => expect(currencyOf(text)).toBe(currency));
});

describe("remembering", () => {
  it("is the same for two lists of one shape", () => {
    expect(headerFingerprint(["Ref Des", "QTY."])).toBe(headerFingerprint(["RefDes", "qty"]));
    expect(headerFingerprint(["Ref", "Qty"])).not.toBe(headerFingerprint(["Qty", "Ref"]));
  });

  it("puts what a person settled over the guess", () => {
    const first = guess("Ref;Foo\nR1;a b\nR2;c d");
    const settled = mappingOf(first).columns.map((column) => ({
      ...column,
      meaning: column.column === 1 ? ("drawer" as const) : column.meaning,
    }));
    const again = applyRemembered(guess("Ref;Foo\nR7;e f\nR8;g h"), settled);
    expect(again.columns[1]).toMatchObject({ meaning: "drawer", reason: "remembered" });
  });
});
