// @vitest-environment happy-dom
import { describe, expect, it } from "vitest";
import { readForm } from "#src/components/forms/read-form.ts";

function formOf(html: string): HTMLFormElement {
  document.body.innerHTML = `<form>${html}</form>`;
  return document.querySelector("form") as HTMLFormElement;
}
const bodyOf = (html: string) => readForm(formOf(html)).body;

describe("a plain form as JSON", () => {
  it("takes text as it is, and leaves out controls without a name or switched off", () => {
    expect(
      bodyOf(`
        <input name="email" value=" ines@example.org "><input value="unnamed">
        <input name="off" value="x" disabled><textarea name="note">two words</textarea>
        <button name="send" value="x">Send</button>`),
    ).toEqual({ email: " ines@example.org ", note: "two words" });
  });

  it("reads numbers, amounts and check boxes as what they are", () => {
    expect(
      bodyOf(`
        <input name="days" data-as="number" value="90"><input name="rate" data-as="money" value="€12,5">
        <input type="checkbox" name="keys" data-as="flag" value="on" checked>
        <input type="checkbox" name="other" data-as="flag" value="on">`),
    ).toEqual({ days: 90, rate: "12.50", keys: true, other: false });
  });

  it("gathers check boxes of one name, also when none is checked", () => {
    const boxes = (one: string, two: string) => `
      <input type="checkbox" name="kits" data-as="list" value="a" ${one}>
      <input type="checkbox" name="kits" data-as="list" value="b" ${two}>`;
    expect(bodyOf(boxes("checked", "checked"))).toEqual({ kits: ["a", "b"] });
    expect(bodyOf(boxes("", "checked"))).toEqual({ kits: ["b"] });
    expect(bodyOf(boxes("", ""))).toEqual({ kits: [] });
  });

  it("takes the radio button that is chosen", () => {
    const radios = `<input type="radio" name="role" value="owner"><input type="radio" name="role" value="seller" checked>`;
    expect(bodyOf(radios)).toEqual({ role: "seller" });
  });

  it("never makes up a value for an empty field", () => {
    expect(
      bodyOf(`
        <input name="plain"><input name="left" data-empty="omit">
        <input name="none" data-as="money" data-empty="null"><input name="days" data-as="number">`),
    ).toEqual({ plain: "", none: null, days: "" });
  });

  it("says what is wrong with an amount before it is sent", () => {
    const { faults } = readForm(formOf(`<input name="rate" data-as="money" value="-3">`));
    expect(faults).toEqual([{ at: "rate", message: "An amount here is never below zero." }]);
  });
});
