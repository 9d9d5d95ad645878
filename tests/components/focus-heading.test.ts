// @vitest-environment happy-dom
import { beforeEach, describe, expect, it } from "vitest";
import { focusHeading } from "#src/components/focus-heading.ts";

/** A page as this function sees it: the real document, with where the person came from. */
function arrivedFrom(referrer: string): Document {
  Object.defineProperty(document, "referrer", { value: referrer, configurable: true });
  return document;
}

beforeEach(() => {
  document.body.innerHTML = '<h1>How many kits should we make?</h1><input aria-label="Find">';
  location.hash = "";
});

describe("focus after a page change", () => {
  it("goes to the question", () => {
    focusHeading(arrivedFrom(`${location.origin}/workshops/1`), "navigate");
    expect(document.activeElement?.tagName).toBe("H1");
  });

  it.each([
    ["a first visit", "", "navigate"],
    ["a visit from another site", "https://example.org/", "navigate"],
    ["a reload", "here", "reload"],
    ["going back", "here", "back_forward"],
  ])("stays where it is after %s", (_, from, how) => {
    focusHeading(arrivedFrom(from === "here" ? `${location.origin}/x` : from), how);
    expect(document.activeElement).toBe(document.body);
  });

  it("leaves a field that has focus, and a link into the page", () => {
    document.querySelector("input")?.focus();
    focusHeading(arrivedFrom(`${location.origin}/x`), "navigate");
    expect(document.activeElement?.tagName).toBe("INPUT");
    document.querySelector("input")?.blur();
    location.hash = "#offers";
    focusHeading(arrivedFrom(`${location.origin}/x`), "navigate");
    expect(document.activeElement).toBe(document.body);
  });
});
