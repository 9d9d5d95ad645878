import { HEADING_WORDS } from "./heading-words.ts";
import { MEANINGS, type Meaning } from "./meanings.ts";

/** How well a heading names a meaning. */
export interface HeadingMatch {
  meaning: Meaning;
  /** 6 for a heading that means nothing else, 4 where it is part of a longer heading, 3 for an ambiguous one. */
  weight: number;
  supplier: string | null;
  breakQuantity: number | null;
}

const STRONG = 6;
const PART = 4;
const WEAK = 3;

/**
 * A heading in one spelling: lower case, no accents, no punctuation, joined words parted
 * ("RefDes", "Manufacturer_Part_Number"), "#" and "№" as "no".
 */
export function plainHeading(text: string): string {
  return text
    .normalize("NFKC")
    .replace(/[#№]|\bn[°º]/gi, " no ")
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replace(/\.\d{1,2}\s*$/, "")
    .normalize("NFD")
    .replace(/[\u0300-\u036f]/g, "")
    .normalize("NFC")
    .toLowerCase()
    .replace(/ł/g, "l")
    .replace(/ß/g, "ss")
    .replace(/[^\p{L}\p{N}%€$£¥+@≥]+/gu, " ")
    .trim();
}

const EXACT: ReadonlyMap<string, HeadingMatch[]> = indexWords();

function indexWords(): Map<string, HeadingMatch[]> {
  const index = new Map<string, HeadingMatch[]>();
  for (const meaning of MEANINGS) {
    const { strong, weak = "" } = HEADING_WORDS[meaning];
    for (const [words, weight] of [
      [strong, STRONG],
      [weak, WEAK],
    ] as const)
      for (const word of words.split("|").filter((text) => text !== "")) {
        const known = index.get(word) ?? [];
        if (!known.some((match) => match.meaning === meaning))
          known.push({ meaning, weight, supplier: null, breakQuantity: null });
        index.set(word, known);
      }
  }
  return index;
}

/** Parts of longer headings: "Quantity on the board", "Preis in EUR", "Footprint (THT)". First match counts. */
const PARTS: readonly (readonly [RegExp, Meaning])[] = [
  [
    /\b(?:do not|not|no|nicht|non|ne pas) (?:place|populate|fit|fitted|install|mount|bestuckt|monte)/,
    "do-not-place",
  ],
  [
    /\b(?:manufacturer|mfr|mfg|mfgr|manf|manuf|maker|hersteller|herst|fabricant|fabricante|produttore|costruttore|producenta|vyrobce)\b.*\b(?:part|parts|no|nr|nummer|number|num|pn|p n|code|ref|reference|referencia|codice|teilenummer|id)\b/,
    "part-number",
  ],
  [
    /\b(?:supplier|supp|vendor|distributor|distrib|dist|lieferant|lief|fournisseur|proveedor|fornitore|leverancier|dodavatel|shop|store|stock)\b.*\b(?:part|no|nr|nummer|number|num|pn|p n|code|ref|reference|referencia|codice|sku|id)\b/,
    "order-code",
  ],
  [
    /\b(?:order|total|needed|required|buy|bestell\w*|gesamt|spare|stock|ordered) (?:qty|quantity|menge|count|amount)\b|\b(?:qty|quantity|menge) (?:to )?(?:order|total|ordered|needed|required|buy|x \d+)\b/,
    "leave-out",
  ],
  [/\b(?:minimum|min|mindest\w*) (?:order|qty|quantity|menge)\b/, "minimum-order"],
  [
    /\b(?:total|ext|extended|gesamt|sum|summe|totale|celkem|razem|line)\b.*\b(?:price|cost|preis|prix|precio|prezzo|cena|preco|kosten|eur|usd|€|\$)|\b(?:price|cost|preis|prix|precio|prezzo|cena|preco)\b.*\b(?:total|ext|extended|gesamt|totale|celkem)\b|^(?:total|sum|summe|gesamt)\b/,
    "line-total",
  ],
  [
    /\b(?:price|preis|prix|precio|prezzo|prijs|cena|preco|pris|einzelpreis|stuckpreis|unit cost|цена)\b/,
    "price-each",
  ],
  [
    /\b(?:qty|quantity|anzahl|menge|stuckzahl|cantidad|quantite|quantita|aantal|ilosc|quantidade|antal|количество)\b/,
    "quantity",
  ],
  [/\b(?:designators?|references?|ref des|refdes|referenz|bezeichner)\b/, "designators"],
  [/\b(?:footprint|package|gehause|bauform|boitier|encapsulado|obudowa|pouzdro)\b/, "package"],
  [/\b(?:manufacturer|mfr|hersteller|fabricant|fabricante)\b/, "manufacturer"],
  [/\b(?:supplier|vendor|distributor|lieferant|fournisseur|proveedor|fornitore)\b/, "supplier"],
  [/\bdatasheet|\b(?:url|link|links)\b/, "datasheet"],
  [/\bdesc|\bbeschreibung|\bopis\b/, "description"],
  [/\b(?:value|wert|valeur|valor)\b/, "value"],
  [/\b(?:notes?|remarks?|bemerkung|anmerkung|remarque|comments?)\b/, "note"],
];

/** "… part number", "… order code": the words before name who uses that number. */
const CODE_OF =
  /^(.+?) (?:part no|part number|part num|part nr|part|pn|p n|no|nr|num|number|sku|stock no|stock code|order code|order no|order number|order nr|bestellnummer|bestell nr|artikelnummer|art nr|code|ref|reference|referencia|id)$/;
const NO_SUPPLIER =
  /^(?:manufacturer|mfr|mfg|mfgr|manf|manuf|hersteller|item|line|row|our|my|own|internal|in house|inhouse|serial|drawing|version|revision|model|part|component|schematic|type|lot|batch|article|product|order|stock|supplier|vendor|distributor|alternative|alternate|alt|customer|hs|tariff|phone|page|sheet|pin|board|kit|bin|sr|sl|s|lfd|ref|reference)$/;

const BREAKS: readonly RegExp[] = [
  /^(?:(?:unit )?(?:price|preis|prix|precio|prezzo|prijs|cena|preco|pris|cost|цена|vk|ep)s? )?(?:ab|from|for|at|@|≥|qty|menge|a partir de|des|desde|da|vanaf|od|fran|от|per|bei|pour|para)? ?(\d{1,6}) ?(?:\+|up|pcs|pc|stk|st|stuck|units?|off|ks|szt|pz|u|個|个|шт|ea)?(?: (?:price|preis|prix|precio|cena|€|\$|£|eur|usd|gbp))?$/,
  /^(?:price |preis |prix )?(\d{1,6}) (?:to |bis |a |- ?)?\d{1,6}(?: (?:pcs|stk|st))?$/,
];

/** The quantity a price heading holds from: "100+", "ab 100", "Preis 10", "Price @ 25", "10 - 99". */
export function breakQuantityOf(heading: string): number | null {
  const plain = plainHeading(heading);
  for (const pattern of BREAKS) {
    const found = pattern.exec(plain);
    if (found) return Number(found[1]) > 0 ? Number(found[1]) : null;
  }
  return null;
}

/** Everything a heading may mean, best first. Empty for a heading the vocabulary does not know. */
export function matchHeading(heading: string): HeadingMatch[] {
  const plain = plainHeading(heading);
  if (plain === "" || plain.length > 60) return [];
  const known = EXACT.get(plain);
  if (known) return known;
  const bare = plain
    .replace(/\b(?:in )?(?:eur|usd|gbp|chf|euro|sek|pln|czk|rub|cny|jpy)\b|[€$£¥]/g, " ")
    .replace(/\s+/g, " ")
    .trim();
  if (bare !== plain && bare !== "") {
    const inCurrency = EXACT.get(bare);
    if (inCurrency) return inCurrency;
  }
  const breakQuantity = breakQuantityOf(heading);
  if (breakQuantity !== null)
    return [{ meaning: "price-break", weight: PART, supplier: null, breakQuantity }];
  for (const [pattern, meaning] of PARTS)
    if (pattern.test(plain)) return [{ meaning, weight: PART, supplier: null, breakQuantity: null }];
  return codeOfSupplier(heading, plain);
}

function codeOfSupplier(heading: string, plain: string): HeadingMatch[] {
  const name = CODE_OF.exec(plain)?.[1];
  if (name === undefined || NO_SUPPLIER.test(name)) return [];
  return [
    { meaning: "order-code", weight: PART + 1, supplier: supplierName(heading, name), breakQuantity: null },
  ];
}

/** The heading's own spelling of the supplier's name, without the words that follow it. */
function supplierName(heading: string, plain: string): string {
  const words = heading.split(/[\s_#№]+/).filter((word) => word !== "");
  let own = "";
  for (const word of words) {
    own = own === "" ? word : `${own} ${word}`;
    if (plainHeading(own).length >= plain.length) break;
  }
  return own === "" ? plain : own;
}

/** Three letters of the currency a heading names: "Price(USD)", "Preis €", "EUR". */
export function currencyOf(text: string): string | null {
  const code =
    /(?:^|[^A-Za-z])(EUR|USD|GBP|CHF|SEK|NOK|DKK|PLN|CZK|HUF|RUB|UAH|JPY|CNY|RMB|AUD|CAD|NZD|INR|BRL|HKD|SGD|TRY|ZAR|KRW|TWD)(?![A-Za-z])/i.exec(
      text,
    )?.[1];
  if (code) return code.toUpperCase() === "RMB" ? "CNY" : code.toUpperCase();
  for (const [sign, currency] of CURRENCY_SIGNS) if (sign.test(text)) return currency;
  return null;
}

const CURRENCY_SIGNS: readonly (readonly [RegExp, string])[] = [
  [/A\$|AU\$/, "AUD"],
  [/C\$|CA\$/, "CAD"],
  [/HK\$/, "HKD"],
  [/R\$/, "BRL"],
  [/€|\beuros?\b/i, "EUR"],
  [/\$/, "USD"],
  [/£/, "GBP"],
  [/zł/i, "PLN"],
  [/Kč/i, "CZK"],
  [/₽|руб/i, "RUB"],
  [/₴|грн/i, "UAH"],
  [/₹/, "INR"],
  [/元|人民币/, "CNY"],
  [/円/, "JPY"],
  [/\bFr\./, "CHF"],
];
