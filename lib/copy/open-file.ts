import { unpackCopy } from "./copy-file";
import { type CopyRead, readCopy } from "./saved-copy";

/** From the bytes of a chosen file to the checked copy, or a sentence that says why not. Never throws. */
export async function openCopyFile(bytes: Uint8Array<ArrayBuffer>): Promise<CopyRead> {
  const unpacked = await unpackCopy(bytes);
  return unpacked.ok ? readCopy(unpacked.text) : unpacked;
}
