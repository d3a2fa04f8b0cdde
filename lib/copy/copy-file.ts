/**
 * The file that a copy is saved as: gzip where the browser can, plain JSON otherwise, and what it is called. Reading
 * goes by what is in the file, never by its name: a phone's apps rename what they pass on.
 */

/** Beyond this a file is no copy of ours; unpacking it would only fill the phone. */
const CHARACTERS_AT_MOST = 400_000_000;

export interface CopyFile {
  name: string;
  type: string;
  bytes: Uint8Array<ArrayBuffer>;
}

/** "notchbook-Anas-workshop-2026-03-14-0930": the workshop's own letters, and when it was made where she is. */
export function copyFileName(workshop: string, madeAt: Date): string {
  const pad = (n: number) => String(n).padStart(2, "0");
  const day = `${madeAt.getFullYear()}-${pad(madeAt.getMonth() + 1)}-${pad(madeAt.getDate())}`;
  const time = `${pad(madeAt.getHours())}${pad(madeAt.getMinutes())}`;
  const named = workshop
    .normalize("NFC")
    .replace(/['’]/gu, "")
    .replace(/[^\p{L}\p{M}\p{N}]+/gu, "-")
    .replace(/^-|-$/gu, "");
  return ["notchbook", [...named].slice(0, 40).join(""), day, time].filter(Boolean).join("-");
}

const bytesOf = async (stream: ReadableStream<Uint8Array>): Promise<Uint8Array<ArrayBuffer>> =>
  new Uint8Array(await new Response(stream as ReadableStream<Uint8Array<ArrayBuffer>>).arrayBuffer());

/** To be saved on the phone. */
export async function packCopy(text: string, name: string): Promise<CopyFile> {
  const plain = new Blob([text]);
  if (typeof CompressionStream === "undefined")
    return { name: `${name}.json`, type: "application/json", bytes: await bytesOf(plain.stream()) };
  const packed = plain.stream().pipeThrough(new CompressionStream("gzip"));
  return { name: `${name}.json.gz`, type: "application/gzip", bytes: await bytesOf(packed) };
}

/** To be sent: browsers hand only a few kinds of file to other apps, plain text among them. */
export function textCopy(text: string, name: string): CopyFile {
  return { name: `${name}.txt`, type: "text/plain", bytes: new TextEncoder().encode(text) };
}

export type Unpacked = { ok: true; text: string } | { ok: false; say: string };

const isGzip = (bytes: Uint8Array): boolean => bytes[0] === 0x1f && bytes[1] === 0x8b;

/** The text of a file, whichever way it was saved. Never throws. */
export async function unpackCopy(bytes: Uint8Array<ArrayBuffer>): Promise<Unpacked> {
  if (bytes.length === 0)
    return { ok: false, say: "This file is empty. Send or fetch it once more, or choose an earlier copy." };
  if (isGzip(bytes) && typeof DecompressionStream === "undefined")
    return {
      ok: false,
      say: "This browser cannot unpack the file. Bring the browser up to date, then choose the file again.",
    };
  const plain = new Blob([bytes]).stream();
  const reader = (isGzip(bytes) ? plain.pipeThrough(new DecompressionStream("gzip")) : plain).getReader();
  const decoder = new TextDecoder("utf-8");
  const parts: string[] = [];
  let length = 0;
  try {
    for (;;) {
      const { done, value } = await reader.read();
      const part = done ? decoder.decode() : decoder.decode(value, { stream: true });
      parts.push(part);
      length += part.length;
      if (length > CHARACTERS_AT_MOST) {
        await reader.cancel();
        return { ok: false, say: "This file is far too large for a copy of Notchbook. Choose another file." };
      }
      if (done) return { ok: true, text: parts.join("") };
    }
  } catch {
    return {
      ok: false,
      say: "This copy is damaged: it cannot be unpacked to its end. Nothing was read in. Send or fetch the file once more, or choose an earlier copy.",
    };
  }
}
