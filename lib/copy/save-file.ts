/** Hands a file to the phone: saved among its downloads, or to another app by the phone's own share sheet. */
import { type CopyFile } from "./copy-file";

const asFile = ({ bytes, name, type }: CopyFile): File => new File([bytes], name, { type });

export function downloadFile(file: CopyFile): void {
  const url = URL.createObjectURL(asFile(file));
  const link = document.createElement("a");
  link.href = url;
  link.download = file.name;
  link.click();
  // The browser reads it on after the click; a minute is ample for a few megabytes.
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
}

export function canShareFile(file: CopyFile): boolean {
  return typeof navigator.canShare === "function" && navigator.canShare({ files: [asFile(file)] });
}

/** "put-off": the user closed the sheet. "refused": the phone would not. */
export async function shareFile(file: CopyFile): Promise<"sent" | "put-off" | "refused"> {
  try {
    await navigator.share({ files: [asFile(file)], title: file.name });
    return "sent";
  } catch (error) {
    return error instanceof DOMException && error.name === "AbortError" ? "put-off" : "refused";
  }
}
