import type { LineMark, PartClass } from "#src/shapes/limits.ts";

/** What the kinds of parts are called: one of them, and a group of them. */
export const CLASS_WORDS: Readonly<Record<PartClass, { one: string; many: string }>> = {
  resistor: { one: "Resistor", many: "Resistors" },
  potentiometer: { one: "Potentiometer", many: "Potentiometers" },
  capacitor: { one: "Capacitor", many: "Capacitors" },
  inductor: { one: "Inductor", many: "Inductors" },
  diode: { one: "Diode", many: "Diodes" },
  led: { one: "LED", many: "LEDs" },
  transistor: { one: "Transistor", many: "Transistors" },
  "integrated-circuit": { one: "Integrated circuit", many: "Integrated circuits" },
  crystal: { one: "Crystal", many: "Crystals" },
  switch: { one: "Switch", many: "Switches" },
  connector: { one: "Connector", many: "Connectors" },
  "battery-holder": { one: "Battery holder", many: "Battery holders" },
  mechanical: { one: "Mechanical", many: "Mechanical parts" },
  board: { one: "Board", many: "Boards" },
  other: { one: "Other", many: "Other parts" },
};

/** Groups of a parts list stand in the order in which a board is soldered: low parts first. */
export const CLASSES_IN_ORDER = Object.keys(CLASS_WORDS) as PartClass[];

/** How a line counts. */
export const MARK_WORDS: Readonly<Record<LineMark, string>> = {
  "in-kit": "In the kit",
  option: "Option",
  "builders-own": "Builder’s own",
  "do-not-place": "Do not place",
};
export const MARKS_IN_ORDER = Object.keys(MARK_WORDS) as LineMark[];
