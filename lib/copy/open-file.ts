import { unpackCopy } from "./copy-file";
import { type CopyRead } from "./read-copy";

/** From the bytes of a chosen file to the checked copy, or a sentence that says why not. */
export async function openCopyFile(bytes: Uint8Array<ArrayBuffer>): Promise<CopyRead> {
  const unpacked = await unpackCopy(bytes);
  if (!unpacked.ok) return unpacked;
  // At the first use: what checks a copy is heavy, and every screen would carry it.
  const { readCopy } = await import("./read-copy");
  return readCopy(unpacked.text);
}
