import type { BoardMarks } from "./board-marks.ts";
import { padRows } from "./pad-rows.ts";

const RESISTOR_X = [22, 32.2, 35, 45.2];
const UPPER_Y = [5, 8, 11];
const LOWER_Y = [31, 34, 37];
const CHIP_X = [23.4, 25.94, 28.48, 31.02, 33.56, 36.1, 38.64];
const LED_AT = [
  [46.5, 15],
  [52.5, 15],
  [46.5, 21],
  [52.5, 21],
  [46.5, 27],
  [52.5, 27],
] as const;

const silkResistors = [...UPPER_Y, ...LOWER_Y]
  .flatMap((y) => [`M23.6 ${y - 0.9}h7v1.8h-7Z`, `M36.6 ${y - 0.9}h7v1.8h-7Z`])
  .join("");
const silkLeds = LED_AT.map(([x, y]) => `M${x - 2.5} ${y}a2.5 2.5 0 1 0 5 0a2.5 2.5 0 1 0-5 0`).join("");

/** The board of the demonstration kit Dew Lantern, invented: 58 × 42 mm with a comb that feels dew. */
export const DEW_LANTERN: BoardMarks = {
  holes: [
    [4, 4, 5.4],
    [54, 4, 5.4],
    [4, 38, 5.4],
    [54, 38, 5.4],
  ],
  pads: [
    ...padRows(RESISTOR_X, UPPER_Y),
    ...padRows(RESISTOR_X, LOWER_Y),
    ...padRows(CHIP_X, [17, 24.6]),
    ...LED_AT.flatMap(([x, y]): [number, number][] => [
      [x - 1.27, y],
      [x + 1.27, y],
    ]),
    ...padRows([12, 13.9, 17.5, 19.5], [37]),
    ...padRows([24, 29, 33, 35.54, 38.08], [27.8]),
  ],
  copper: "M16 10H5.5V31H16M7 12.7H18V28.5M18 28.5H7M5.5 15.3H16M7 18H18M5.5 20.6H16M7 23.2H18M5.5 25.9H16",
  silk: `${silkResistors}${silkLeds}M22 18.4H40V23.4H22V22A1 1 0 0 0 22 20ZM22.7 26.6h8v2.4h-8ZM31.5 29a4 4 0 0 1 8 0Z`,
};
