// @vitest-environment happy-dom
import { expect, it } from "vitest";
import { showLocalMoments } from "#src/components/local-moments.ts";
import { momentText } from "#src/components/moment-text.ts";

const AT = Date.UTC(2026, 2, 9, 23, 5);

it("writes a day, or a day and its time, as the time zone has it", () => {
  expect(momentText(AT, "day", "UTC")).toBe("9 March 2026");
  expect(momentText(AT, "time", "UTC")).toBe("9 March 2026, 23:05");
  expect(momentText(AT, "time", "Asia/Tokyo")).toBe("10 March 2026, 08:05");
});

it("writes the moments of a page anew in the reader's time, which then needs no name", () => {
  const iso = new Date(AT).toISOString();
  document.body.innerHTML = `<time datetime="${iso}" data-moment="time">9 March 2026, 23:05 UTC</time>
    <time datetime="${iso}" data-moment="day">9 March 2026 UTC</time><time>as it is</time>`;
  showLocalMoments(document, "Asia/Tokyo");
  const written = [...document.querySelectorAll("time")].map(({ textContent }) => textContent);
  expect(written).toEqual(["10 March 2026, 08:05", "10 March 2026", "as it is"]);
});
