import type { PartClass } from "#src/shapes/limits.ts";
import { designatorLetters } from "./designators.ts";

/**
 * Class letters of IEEE 315-1975 / ASME Y14.44-2008 with the aliases in use (IC, SW, LED, CON, …) and the
 * letters of German and Russian practice. T, Q, V and X mean several things; the text decides, see TEXTS.
 */
const LETTERS: Readonly<Record<string, PartClass>> = {
  R: "resistor",
  RA: "resistor",
  RN: "resistor",
  RP: "resistor",
  RT: "resistor",
  NTC: "resistor",
  PTC: "resistor",
  LDR: "resistor",
  RS: "resistor",
  MOV: "resistor",
  VDR: "resistor",
  RV: "potentiometer",
  VR: "potentiometer",
  POT: "potentiometer",
  TRIM: "potentiometer",
  TM: "potentiometer",
  C: "capacitor",
  CV: "capacitor",
  CP: "capacitor",
  CT: "capacitor",
  CX: "capacitor",
  L: "inductor",
  FB: "inductor",
  FL: "inductor",
  EB: "inductor",
  LED: "led",
  LD: "led",
  DS: "led",
  HL: "led",
  DL: "led",
  D: "diode",
  CR: "diode",
  DZ: "diode",
  Z: "diode",
  ZD: "diode",
  BR: "diode",
  VD: "diode",
  TVS: "diode",
  Q: "transistor",
  T: "transistor",
  TR: "transistor",
  VT: "transistor",
  SCR: "transistor",
  U: "integrated-circuit",
  IC: "integrated-circuit",
  AR: "integrated-circuit",
  DA: "integrated-circuit",
  DD: "integrated-circuit",
  OK: "integrated-circuit",
  MCU: "integrated-circuit",
  LDO: "integrated-circuit",
  OPT: "integrated-circuit",
  N: "integrated-circuit",
  Y: "crystal",
  XTAL: "crystal",
  XT: "crystal",
  OSC: "crystal",
  ZQ: "crystal",
  QZ: "crystal",
  S: "switch",
  SW: "switch",
  PB: "switch",
  BTN: "switch",
  SA: "switch",
  SB: "switch",
  KEY: "switch",
  DIP: "switch",
  ENC: "switch",
  J: "connector",
  P: "connector",
  CN: "connector",
  CON: "connector",
  CONN: "connector",
  X: "connector",
  XS: "connector",
  XP: "connector",
  JP: "connector",
  H: "connector",
  HDR: "connector",
  PL: "connector",
  SK: "connector",
  TB: "connector",
  ICSP: "connector",
  ISP: "connector",
  USB: "connector",
  JMP: "connector",
  SV: "connector",
  CL: "connector",
  W: "connector",
  JK: "connector",
  ST: "connector",
  SL: "connector",
  BT: "battery-holder",
  BAT: "battery-holder",
  GB: "battery-holder",
  MP: "mechanical",
  MH: "mechanical",
  HW: "mechanical",
  HS: "mechanical",
  M: "other",
  SCREW: "mechanical",
  MEC: "mechanical",
  PCB: "board",
};

/** The edge of a word in any alphabet; `\\b` knows only ASCII letters and would miss "imprimé" and "Übertrager". */
const EDGE = "(?:(?<![\\p{L}\\p{N}_])(?=[\\p{L}\\p{N}_])|(?<=[\\p{L}\\p{N}_])(?![\\p{L}\\p{N}_]))";

function inAnyAlphabet(words: readonly (readonly [RegExp, PartClass])[]): [RegExp, PartClass][] {
  return words.map(([pattern, partClass]) => [
    new RegExp(pattern.source.replaceAll("\\b", EDGE), "iu"),
    partClass,
  ]);
}

/** Words of the text that say the class, in several languages; the first that is found counts. */
const TEXTS: readonly (readonly [RegExp, PartClass])[] = inAnyAlphabet([
  [
    /\b(?:transformer|transformator|übertrager|transformateur|transformador|trasformatore|relay|relais|relé|rel[ée]|przekaźnik|fuse|polyfuse|sicherung|fusible|fusibile|bezpiecznik|pojistka|säkring|buzzer|speaker|lautsprecher|microphone|mikrofon|motor|antenna|antenne|реле|предохранитель|трансформатор)\b/i,
    "other",
  ],
  [
    /\b(?:screw|schraube|nut|mutter|washer|unterlegscheibe|spacer|stand-?offs?|abstands\w*|rivet|bolt|distanz\w*|knob|knopf|feet|foot|bumper|enclosure|gehäuse mit|case for|heat ?sinks?|kühlkörper|vis\b|écrou|tornillo|tuerca|vite\b|dado\b|šroub|matice|śruba|nakrętka|parafuso|porca|skruv|mutter|mounting ?hole|mount-?hole|fiducial|standoffs)/i,
    "mechanical",
  ],
  [
    /\b(?:socket|sockel|header|connector|conn\b|stecker|buchse|stiftleiste|buchsenleiste|klemme|terminal|jack|plug|pinhead|pin ?header|receptacle|connecteur|conector|connettore|złącze|konektor|kontakt|разъ[её]м|ソケット|コネクタ|接插件|连接器|jumper)/i,
    "connector",
  ],
  [
    /\b(?:led|leds|leuchtdiode|light emitting|diode électroluminescente|diodo led|светодиод|发光二极管)\b|\bled_/i,
    "led",
  ],
  [
    /\b(?:trim(?:mer|pot)s?|potentiometer|potentiomètre|potenciómetro|potenziometro|poti|potmeter|potencjometr|rheostat|variable resistor|res_adj|res-adj|потенциометр|可変抵抗|电位器)|^pot\b|\d\s?[km]?(?:Ω|ohms?)?[ -]?(?:lin|log)\b|\b[abc]\d{1,3}k\b/i,
    "potentiometer",
  ],
  [
    /\b(?:battery|batterie|cell) ?(?:holder|clip|box|halter)|batteriehalter|porta pile|portapilas|coupleur de pile/i,
    "battery-holder",
  ],
  [
    /\b(?:crystal|quarz|resonator|oscillator|xtal|quartz|cristal|cuarzo|kvarts|kwarc|krystal|кварц|クリスタル|晶振)|\d\s?[mk]hz\b/i,
    "crystal",
  ],
  [
    /\b(?:resistor|resistors|widerstand|widerstände|res\b|résistance|resistencia|resistenza|weerstand|rezystor|odpor|rezistor|resistor de|motstånd|резистор|抵抗|电阻)/i,
    "resistor",
  ],
  [
    /\b(?:capacitor|capacitors|capactior|kondensator|elko|cap\b|condensateur|condensador|condensatore|condensator|kondenzátor|конденсатор|コンデンサ|电容|mlcc)/i,
    "capacitor",
  ],
  [
    /\b(?:inductor|drossel|spule|coil|choke|ferrite|inductance|bobine|bobina|induttore|spoel|cewka|dławik|tlumivka|indutor|дроссель|индуктивность|インダクタ|电感)/i,
    "inductor",
  ],
  [
    /\b(?:transistors?|mosfets?|bjt|npn|pnp|jfet|igbt|thyristor|triac|tranzystor|tranzistor|транзистор|トランジスタ|三极管)\b/i,
    "transistor",
  ],
  [
    /\b(?:diodes?|dioden|diodo|rectifier|zener|schottky|dioda|gleichrichter|диод|ダイオード|二极管|1n400\d|1n4148|1n58\d\d)\b/i,
    "diode",
  ],
  [
    /\b(?:push ?buttons?|switch(?:es)?|taster|schalter|tact(?:ile)?|drucktaster|interrupteur|poussoir|interruptor|pulsador|interruttore|pulsante|schakelaar|przełącznik|przycisk|přepínač|tlačítko|strömbrytare|переключатель|кнопка|スイッチ|开关|encoder)\b/i,
    "switch",
  ],
  [
    /\b(?:microcontroller|mikrocontroller|op-?amp|regulator|spannungsregler|integrated circuits?|ics?|mcu|eprom|eeprom|flash|timer|driver|amplifier|régulateur|regulador|regolatore|микросхема|マイコン|集成电路)\b/i,
    "integrated-circuit",
  ],
  [
    /^(?:pcb|board|platine|leiterplatte|circuit board|printed circuit board|bare board|circuit imprimé|carte|placa|placa de circuito|circuito stampato|printplaat|płytka|deska plošných spojů|dps|kretskort|плата)\b|^(?:プリント)?基板|电路板|\b(?:main|bare|circuit|printed) board\b|\bpcb\b(?! (?:mount|terminal|header|power|connector|screw|socket|jack|relay))/i,
    "board",
  ],
]);

/** Texts that overrule the letters of a designator: what a T, Q, X, D or R is, where letters mean several things. */
const OVERRULES: Readonly<Record<string, readonly PartClass[]>> = {
  R: ["potentiometer"],
  D: ["led"],
  Q: ["crystal"],
  T: ["other"],
  X: ["crystal"],
  Z: ["crystal"],
  K: ["switch"],
  P: ["potentiometer"],
  VR: ["integrated-circuit"],
  TR: ["potentiometer", "other"],
  B: ["battery-holder", "switch"],
  J: ["switch"],
  U: ["connector"],
  S: ["connector"],
  V: ["diode", "led"],
  H: ["mechanical"],
  E: ["capacitor"],
};

/** By letters: the texts that may overrule them, in their order, with those that would confirm the letters before. */
const DOUBTS: ReadonlyMap<string, readonly (readonly [RegExp, PartClass])[]> = new Map(
  Object.entries(OVERRULES).map(([letters, overrules]) => {
    const last = TEXTS.findLastIndex(([, partClass]) => overrules.includes(partClass));
    const either = [...overrules, LETTERS[letters]];
    return [letters, TEXTS.slice(0, last + 1).filter(([, partClass]) => either.includes(partClass))];
  }),
);

/** The class a text names, or `null`. */
export function classFromText(text: string): PartClass | null {
  for (const [pattern, partClass] of TEXTS) if (pattern.test(text)) return partClass;
  return null;
}

/** The class the letters of a designator stand for, or `null` for a name. */
export function classFromDesignator(designator: string): PartClass | null {
  if (!/\d/.test(designator) && !/^(?:LED|MCU|LDO|ICSP|ISP|USB|ENC|[RCLDQ][a-z_]\w*)$/.test(designator))
    return null;
  const byLetters = LETTERS[designatorLetters(designator)];
  if (byLetters) return byLetters;
  return /^[RC][a-z_]/.test(designator) ? (LETTERS[designator.slice(0, 1)] ?? null) : null;
}

export interface ClassGuess {
  class: PartClass;
  from: "designator" | "text" | "nothing";
}

/**
 * The class of a part from the letters of its first designator and the texts of its row. The letters lead;
 * a text overrules them only where the same letters are in use for both (Q for transistor and crystal).
 */
export function guessClass(designators: readonly string[], texts: readonly (string | null)[]): ClassGuess {
  const first = designators[0];
  const byLetters = first === undefined ? null : classFromDesignator(first);
  if (byLetters === null) {
    const words = classFromText(texts.filter((text) => text !== null).join(" ; "));
    return words === null ? { class: "other", from: "nothing" } : { class: words, from: "text" };
  }
  const doubts = DOUBTS.get(designatorLetters(first ?? ""));
  if (doubts !== undefined) {
    const words = texts.filter((text) => text !== null).join(" ; ");
    const said = doubts.find(([pattern]) => pattern.test(words));
    if (said && said[1] !== byLetters) return { class: said[1], from: "text" };
  }
  return { class: byLetters, from: "designator" };
}

const NAMED: Readonly<Record<string, PartClass>> = {
  ic: "integrated-circuit",
  ics: "integrated-circuit",
  caps: "capacitor",
  leds: "led",
  hardware: "mechanical",
  mechanics: "mechanical",
  mechanik: "mechanical",
};

/** What a cell of a column for the kind of part says; `null` if it names no class. */
export function classFromColumn(text: string): PartClass | null {
  const plain = text.trim().toLowerCase();
  return plain === "" ? null : (NAMED[plain] ?? classFromText(plain));
}
