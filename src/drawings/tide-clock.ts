import type { BoardMarks } from "./board-marks.ts";

const MIDDLE = 32;
const LIGHTS = 24;
const LIGHTS_FROM_MIDDLE = 26;

const lights = Array.from({ length: LIGHTS }, (_, place): [number, number] => {
  const turn = (place / LIGHTS) * 2 * Math.PI;
  const along = (distance: number) => Math.round((MIDDLE + distance) * 100) / 100;
  return [along(LIGHTS_FROM_MIDDLE * Math.sin(turn)), along(-LIGHTS_FROM_MIDDLE * Math.cos(turn))];
});

/** The board of the demonstration kit Tide Clock, invented: round, 64 mm, twenty-four lights about the motor's shaft. */
export const TIDE_CLOCK: BoardMarks = {
  holes: [[MIDDLE, MIDDLE, 6.4]],
  pads: lights,
  silk: "M13 32a19 19 0 1 0 38 0a19 19 0 1 0-38 0",
};
