import { describe, expect, it } from "vitest";
import { readPrintFonts } from "@/lib/pdf/print-fonts";
import { fontFile, printFonts } from "./print-tools";

const KB = 1024;

describe("the fonts of print", () => {
  it("are small enough to be kept on the phone", () => {
    for (const name of ["regular", "bold"] as const) expect(fontFile(name).byteLength).toBeLessThan(170 * KB);
  });

  it("cover what is printed", () => {
    const needed = [
      ..."ABCXYZabcxyz0123456789.,;:!?'\"()/&%#@*+-=",
      ..."½¼¾⅛⅜⅝⅞⁄×←↑→↓−–—‘’“”„«»…•·№",
      ..."ÀÉÎÕÜßæøåçñłżźćęąőűşţșțğıİ",
      ..."ẠẢẤẦẨẪẬẮẰẲẴẶẸẺẼẾỀỂỄỆỈỊỌỎỐỒỔỖỘỚỜỞỠỢỤỦỨỪỬỮỰỲỴỶỸđơư",
      ..."ΑΒΓΔΩαβγδωάέήίόύώςϊϋΐΰ",
      ..."АБВГЖЙЩЪЫЭЮЯабвгжйщъыэюяёіїєґўђћљњџ",
      ..."€£¥₦₹₵₫₱₺₽₴₸",
    ];
    expect(needed.filter((letter) => !printFonts.covers(letter.codePointAt(0)!))).toEqual([]);
  });

  it("leave scripts that need shaping to the browser", () => {
    for (const letter of "عאनไ山") expect(printFonts.covers(letter.codePointAt(0)!)).toBe(false);
  });

  it("set figures to one width, so that columns stand under each other", () => {
    for (const bold of [false, true])
      expect(new Set([..."0123456789"].map((digit) => printFonts.width(digit, 10, bold))).size).toBe(1);
  });

  it("say so when a file is no font", () => {
    const page = new TextEncoder().encode("<!doctype html>").buffer as ArrayBuffer;
    expect(() => readPrintFonts(page, page)).toThrow(/print-regular\.ttf is not a TrueType font/);
  });
});
