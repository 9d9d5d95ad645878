// @vitest-environment happy-dom
import { beforeEach, describe, expect, it } from "vitest";
import { meetOther, takeTheirs } from "#src/components/forms/meet-other.ts";

/** The board of a kit as SendForm.astro draws it. */
const FORM = `
  <form>
    <input type="hidden" name="version" value="3" data-as="number">
    <label><input type="checkbox" name="boardNeeded" data-as="flag" checked> The kit has a board</label>
    <label for="shape">Shape</label>
    <select id="shape" name="boardShape">
      <option value="rectangle" selected>Rectangle</option><option value="round">Round</option>
    </select>
    <label for="width">Width in mm</label>
    <input id="width" name="boardWidth" value="44" data-as="money" data-empty="null">
    <label for="height">Height in mm</label>
    <input id="height" name="boardHeight" value="" data-as="money" data-empty="null">
  </form>`;
const AS_MADE = {
  version: 4,
  boardNeeded: true,
  boardShape: "rectangle",
  boardWidth: "44",
  boardHeight: null,
  name: "Teasel Lamp",
};

beforeEach(() => {
  document.body.innerHTML = FORM;
});
const form = () => document.querySelector("form") as HTMLFormElement;
const field = (name: string) => form().elements.namedItem(name) as HTMLInputElement;

describe("a form that met a newer row", () => {
  it("takes its version, and can be sent again where the other changed nothing of it", () => {
    field("boardWidth").value = "52";
    expect(meetOther(form(), { ...AS_MADE, name: "Teasel" })).toEqual([]);
    expect(field("version").value).toBe("4");
    expect(field("boardWidth").value).toBe("52");
  });

  it("takes over fields that only the other changed, so that sending ours does not undo them", () => {
    field("boardWidth").value = "52";
    const theirs = { ...AS_MADE, boardNeeded: false, boardShape: "round", boardHeight: "30" };
    expect(meetOther(form(), theirs)).toEqual([]);
    expect(field("boardNeeded").checked).toBe(false);
    expect(field("boardShape").value).toBe("round");
    expect(field("boardHeight").value).toBe("30");
    expect(field("boardWidth").value).toBe("52");
  });

  it("names both values of a field that both changed, in the words of the form", () => {
    field("boardShape").value = "round";
    field("boardWidth").value = "52";
    field("boardHeight").value = "30,5";
    const theirs = { ...AS_MADE, boardShape: "round", boardWidth: null, boardHeight: "30.50" };
    const differences = meetOther(form(), theirs);
    expect(differences).toEqual([
      { name: "boardWidth", label: "Width in mm", yours: "52", theirs: "nothing" },
    ]);
    takeTheirs(form(), theirs, differences);
    expect(field("boardWidth").value).toBe("");
  });
});
