import { describe, expect, it } from "vitest";
import { columnKeys } from "#src/components/islands/parts-grid/cell-text.ts";
import { gridLayout } from "#src/components/islands/parts-grid/grid-layout.ts";

const editions = (count: number) => Array.from({ length: count }, (_, at) => ({ id: `e${at}` }));
const columns = (count: number) => columnKeys(editions(count), true, []);
const dropped = (count: number, room: number) => {
  const { keys } = gridLayout(columns(count), room);
  return columns(count).filter((key) => !keys.includes(key));
};

/** Room inside the gutters of DESIGN 3 in windows of 1440, 1280, 1100, 1024 and 768 pixels. */
const ROOM = { 1440: 1344, 1280: 1184, 1100: 1004, 1024: 968, 768: 712 };

describe("the columns of the parts list", () => {
  it("stand in full, a line to a row, with three editions in a window of 1440", () => {
    const layout = gridLayout(columns(3), ROOM[1440]);
    expect(layout).toMatchObject({ keys: columns(3), folded: false });
  });

  it("are folded before any gives way", () => {
    expect(gridLayout(columns(3), ROOM[1280])).toMatchObject({ keys: columns(3), folded: true });
  });

  it("give way where there is less room, never those that say what it is, what it costs and how it stands", () => {
    expect(dropped(3, ROOM[1024])).toEqual(["package", "each"]);
    for (const room of Object.values(ROOM))
      for (const count of [1, 2, 3, 8]) {
        const { keys } = gridLayout(columns(count), room);
        for (const key of ["place", "designators", "part", "perKit", "state"] as const)
          expect(keys).toContain(key);
      }
  });

  it("fit into the room there is from 768 pixels up, with up to three editions", () => {
    for (const room of Object.values(ROOM))
      for (const count of [1, 2, 3]) {
        const { keys, width } = gridLayout(columns(count), room);
        expect([count, keys.reduce((sum, key) => sum + width(key), 32) <= room]).toEqual([count, true]);
      }
  });
});
