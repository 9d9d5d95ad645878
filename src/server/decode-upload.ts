import { analyse } from "chardet";
import iconv from "iconv-lite";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";

export type DecodeProblem =
  | "upload-empty"
  | "upload-too-large"
  | "upload-archive"
  | "upload-old-spreadsheet"
  | "upload-not-text";

export type Decoded = { ok: true; text: string; encoding: string } | { ok: false; code: DecodeProblem };

/** Bytes looked at for control characters and for telling 8-bit encodings apart. */
const SAMPLE = 64 * 1024;

/** First bytes of files that are no text. A ZIP may be XLSX or ODS; OLE2 is XLS, or a workbook behind a password. */
const SIGNATURES: readonly (readonly [number[], DecodeProblem])[] = [
  [[0x50, 0x4b, 0x03, 0x04], "upload-archive"],
  [[0xd0, 0xcf, 0x11, 0xe0], "upload-old-spreadsheet"],
  [[0x25, 0x50, 0x44, 0x46], "upload-not-text"],
  [[0x89, 0x50, 0x4e, 0x47], "upload-not-text"],
  [[0xff, 0xd8, 0xff], "upload-not-text"],
  [[0x47, 0x49, 0x46, 0x38], "upload-not-text"],
  [[0x1f, 0x8b], "upload-not-text"],
];

/** Byte-order marks, Unicode standard 15, table 23-8. UTF-32LE stands before UTF-16LE, whose mark it begins with. */
const MARKS: readonly (readonly [number[], string])[] = [
  [[0xef, 0xbb, 0xbf], "UTF-8"],
  [[0xff, 0xfe, 0x00, 0x00], "UTF-32LE"],
  [[0x00, 0x00, 0xfe, 0xff], "UTF-32BE"],
  [[0xff, 0xfe], "UTF-16LE"],
  [[0xfe, 0xff], "UTF-16BE"],
];

const startsWith = (bytes: Uint8Array, signature: readonly number[]) =>
  signature.every((byte, at) => bytes[at] === byte);

/**
 * Bytes of an upload to text, with the encoding named: by byte-order mark, as UTF-16 without one, as UTF-8
 * where every byte sequence is valid, else by the shape of the letters (Shift-JIS, GB18030, Windows code
 * pages). A file that is mostly UTF-8 is read line by line, odd lines as Windows-1252.
 */
export function decodeUpload(bytes: Uint8Array): Decoded {
  if (bytes.length > UPLOAD_BYTES) return { ok: false, code: "upload-too-large" };
  if (bytes.length === 0) return { ok: false, code: "upload-empty" };
  for (const [signature, code] of SIGNATURES) if (startsWith(bytes, signature)) return { ok: false, code };
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const decoded = withMark(buffer) ?? wide(buffer) ?? narrow(buffer);
  if (decoded === null || hasControls(decoded.text)) return { ok: false, code: "upload-not-text" };
  if (decoded.text.trim() === "") return { ok: false, code: "upload-empty" };
  return { ok: true, ...decoded };
}

interface Text {
  text: string;
  encoding: string;
}

function withMark(buffer: Buffer): Text | null {
  for (const [mark, encoding] of MARKS)
    if (startsWith(buffer, mark))
      return { text: iconv.decode(buffer, encoding).replace(/^\uFEFF/, ""), encoding };
  return null;
}

/** UTF-16 without a mark shows as a zero in every other byte of plain letters. */
function wide(buffer: Buffer): Text | null {
  const sample = buffer.subarray(0, SAMPLE);
  if (sample.length < 4) return null;
  let even = 0;
  let odd = 0;
  sample.forEach((byte, at) => {
    if (byte === 0) at % 2 === 0 ? even++ : odd++;
  });
  const half = sample.length / 2;
  if (odd > half * 0.4 && even < half * 0.05)
    return { text: iconv.decode(buffer, "UTF-16LE"), encoding: "UTF-16LE" };
  if (even > half * 0.4 && odd < half * 0.05)
    return { text: iconv.decode(buffer, "UTF-16BE"), encoding: "UTF-16BE" };
  return null;
}

function narrow(buffer: Buffer): Text | null {
  if (buffer.subarray(0, SAMPLE).includes(0)) return null;
  const strict = strictUtf8(buffer);
  if (strict !== null) return { text: strict, encoding: /^\p{ASCII}*$/u.test(strict) ? "ASCII" : "UTF-8" };
  return mixed(buffer) ?? eightBit(buffer);
}

function strictUtf8(bytes: Uint8Array): string | null {
  try {
    return new TextDecoder("utf-8", { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}

/** A file put together from two: lines that are valid UTF-8 beyond ASCII, and a few that are not. */
function mixed(buffer: Buffer): Text | null {
  const lines: string[] = [];
  let good = 0;
  let odd = 0;
  let start = 0;
  while (start <= buffer.length) {
    const found = buffer.indexOf(0x0a, start);
    const end = found < 0 ? buffer.length : found;
    const line = buffer.subarray(start, end);
    const text = strictUtf8(line);
    if (text === null) odd++;
    else if (line.some((byte) => byte > 0x7f)) good++;
    lines.push(text ?? iconv.decode(line, "windows-1252"));
    start = end + 1;
  }
  return good > 0 && good >= odd ? { text: lines.join("\n"), encoding: "UTF-8 and Windows-1252" } : null;
}

/** Tried after what the letter statistics propose; the first whose letters make sense is taken. */
const ALSO_TRIED = ["windows-1251", "GB18030", "windows-1250"];
/** Tried first: Japanese text passes for rare Chinese characters, but hardly any other text passes for Japanese. */
const TRIED_FIRST = ["Shift_JIS"];

const NAMES: Readonly<Record<string, string>> = {
  Shift_JIS: "Shift-JIS",
  "windows-1250": "Windows-1250",
  "windows-1251": "Windows-1251",
  "windows-1252": "Windows-1252",
  "ISO-8859-1": "Windows-1252",
  "ISO-8859-2": "Windows-1250",
};
const DECODED_AS: Readonly<Record<string, string>> = {
  "ISO-8859-1": "windows-1252",
  "ISO-8859-2": "windows-1250",
};

/**
 * Encodings of one or two bytes a letter. A list holds few letters beyond ASCII, too few for statistics
 * alone, so each proposal must also give words its alphabet can form.
 */
function eightBit(buffer: Buffer): Text {
  const sample = buffer.subarray(0, SAMPLE);
  const proposed = analyse(sample).map((guess) => guess.name as string);
  for (const name of [...TRIED_FIRST, ...proposed, ...ALSO_TRIED]) {
    const codec = DECODED_AS[name] ?? name;
    if (!iconv.encodingExists(codec) || !plausible(iconv.decode(sample, codec), name)) continue;
    return { text: iconv.decode(buffer, codec), encoding: NAMES[name] ?? name };
  }
  return { text: iconv.decode(buffer, "windows-1252"), encoding: "Windows-1252" };
}

const WIDE_LETTERS = "[\\p{Script=Hiragana}\\u30a0-\\u30ff\\p{Script=Han}\\p{Script=Hangul}]";
const WIDE_RUN = new RegExp(`${WIDE_LETTERS}{2,}`, "gu");
const WIDE_SIGNS = new RegExp(`${WIDE_LETTERS}|[Ωμ℃±×　-〿\uff01-\uff5e]`, "gu");
/** Signs that stand inside words only where letters of another code page are taken for Western ones. */
const ODD_IN_WORDS = /\p{L}[¹³¿¯Ÿ]|[¹³¿]\p{L}|œ[^a-z\s]/gu;
const EAST_EUROPEAN = /[ąęłśźżćńčěřšůžďťňőűáéíóúýöüä]/gi;

/** Whether the letters beyond ASCII make sense in the alphabet of an encoding. */
function plausible(text: string, name: string): boolean {
  const beyond = count(text, /[^\p{ASCII}]/gu);
  if (count(text.slice(0, -4), /\uFFFD/g) > 0) return false;
  if (/^(?:Shift_JIS|EUC-JP|ISO-2022-JP|GB18030|Big5|EUC-KR)$/.test(name))
    return count(text, WIDE_RUN) > 0 && count(text, WIDE_SIGNS) > beyond * 0.9;
  if (/1251|KOI8|8859-5|IBM866/i.test(name))
    return (
      count(text, /\p{Script=Cyrillic}{3,}/gu) > 0 &&
      count(text, /\p{Script=Cyrillic}/gu) > beyond * 0.7 &&
      count(text, /[а-яё][А-ЯЁ]/g) < beyond * 0.1
    );
  if (/1250|8859-2/.test(name))
    return count(text, /[ąęłśźżčěřšůžőű]/gi) > 0 && count(text, EAST_EUROPEAN) > beyond * 0.8;
  return (
    /1252|8859-1$/.test(name) &&
    count(text, /[À-ÿ]{3,}/g) === 0 &&
    count(text, ODD_IN_WORDS) === 0 &&
    count(text, /[¡¢¤¦§¨ª¬¯¸¹¾]/g) <= beyond * 0.3
  );
}

function count(text: string, pattern: RegExp): number {
  return text.match(pattern)?.length ?? 0;
}

/** More than a stray control character in a thousand: not a text. */
function hasControls(text: string): boolean {
  const sample = text.slice(0, SAMPLE);
  let controls = 0;
  for (let at = 0; at < sample.length; at++) {
    const code = sample.charCodeAt(at);
    if (code < 32 && code !== 9 && code !== 10 && code !== 13 && code !== 12) controls++;
  }
  return controls > sample.length / 1000 + 1;
}
