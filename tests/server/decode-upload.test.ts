import iconv from "iconv-lite";
import { describe, expect, it } from "vitest";
import { decodeUpload } from "#src/server/decode-upload.ts";
import { UPLOAD_BYTES } from "#src/shapes/limits.ts";

const bytes = (text: string, encoding: string, addBOM = false): Uint8Array =>
  iconv.encode(text, encoding, { addBOM });
const ENGLISH = "Ref,Qty,Value\r\nR1,1,10k\r\nC1,2,100nF\r\n";
const GERMAN = "Bauteil;Stückzahl;Wert;Gehäuse\r\nR1;1;4,7 kΩ;axial\r\nC1;2;10 µF;stehend, größer\r\n";
const WESTERN = "Bauteil;Stückzahl;Wert;Gehäuse\r\nC1;2;10 µF;größer, 105 °C\r\nR1;1;±5 %;0207\r\n";
const POLISH =
  "Oznaczenie;Ilość;Wartość;Nazwa\r\nR1;2;10k;rezystor węglowy\r\nC1;1;100n;kondensator ceramiczny, źródło\r\n";
const RUSSIAN =
  "Обозначение;Кол-во;Номинал;Цена\r\nR1;2;10к;Резистор\r\nC1;1;100n;Конденсатор\r\nИтого;3;;\r\n";
const JAPANESE = "記号,数量,値,備考\r\nR1,2,10k,抵抗 １／４W\r\nC1,1,0.1μF,積層セラミックコンデンサ\r\n";
const CHINESE = "位号,数量,参数,备注\r\nR1,2,10k,碳膜电阻\r\nC1,1,100nF,陶瓷电容\r\n";

describe("bytes of an upload", () => {
  it.each([
    ["ASCII", ENGLISH, bytes(ENGLISH, "ascii")],
    ["UTF-8", GERMAN, bytes(GERMAN, "utf8")],
    ["UTF-8", GERMAN, bytes(GERMAN, "utf8", true)],
    ["UTF-16LE", GERMAN, bytes(GERMAN, "utf-16le", true)],
    ["UTF-16BE", GERMAN, bytes(GERMAN, "utf-16be", true)],
    ["UTF-16LE", ENGLISH, bytes(ENGLISH, "utf-16le")],
    ["UTF-16BE", ENGLISH, bytes(ENGLISH, "utf-16be")],
    ["Windows-1252", WESTERN, bytes(WESTERN, "windows-1252")],
    ["Windows-1250", POLISH, bytes(POLISH, "windows-1250")],
    ["Windows-1251", RUSSIAN, bytes(RUSSIAN, "windows-1251")],
    ["Shift-JIS", JAPANESE, bytes(JAPANESE, "shift_jis")],
    ["GB18030", CHINESE, bytes(CHINESE, "gb18030")],
  ])("%s", (encoding, text, upload) => expect(decodeUpload(upload)).toEqual({ ok: true, text, encoding }));

  it("takes a single degree or micro sign for Western, not for a letter of another alphabet", () => {
    for (const text of ["C1;100 µF;105°C\nR1;10k;x", "R1;10k ±1%;\nC1;1µ;", "Ref;Größe\nR1;3"])
      expect(decodeUpload(bytes(text, "windows-1252"))).toEqual({ ok: true, text, encoding: "Windows-1252" });
  });

  it("reads a file put together of UTF-8 and a Western line", () => {
    const upload = Buffer.concat([
      bytes("Größe;µ\n", "utf8"),
      bytes("Stück\n", "windows-1252"),
      bytes("Höhe", "utf8"),
    ]);
    expect(decodeUpload(upload)).toEqual({
      ok: true,
      text: "Größe;µ\nStück\nHöhe",
      encoding: "UTF-8 and Windows-1252",
    });
  });
});

describe("what is no list", () => {
  it.each([
    ["upload-empty", new Uint8Array()],
    ["upload-empty", bytes(" \r\n\r\n", "utf8")],
    ["upload-archive", Uint8Array.from([0x50, 0x4b, 0x03, 0x04, 20, 0, 6, 0])],
    ["upload-old-spreadsheet", Uint8Array.from([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1])],
    ["upload-not-text", bytes("%PDF-1.7\n1 0 obj", "ascii")],
    ["upload-not-text", Uint8Array.from({ length: 400 }, (_, at) => (at * 37) % 256)],
    ["upload-not-text", Uint8Array.from({ length: 64 }, () => 0)],
    ["upload-too-large", new Uint8Array(UPLOAD_BYTES + 1).fill(65)],
  ])("%s", (code, upload) => expect(decodeUpload(upload)).toEqual({ ok: false, code }));
});
