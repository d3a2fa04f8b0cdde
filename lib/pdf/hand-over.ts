/** Handing a finished file to the phone: its downloads, its printing window. */

const SEEN_BY_PRINTER_MS = 120_000;
/** A frame that the browser refuses to fill says nothing. */
const FILLED_WITHIN_MS = 15_000;

/** Into the browser's downloads. */
export function saveFile(file: File): void {
  const address = URL.createObjectURL(file);
  const link = document.createElement("a");
  link.href = address;
  link.download = file.name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), SEEN_BY_PRINTER_MS);
}

/** Resolves when the print dialogue has been asked for. @throws where this browser shows no PDF inside a page. */
export function printFile(file: File): Promise<void> {
  if (navigator.pdfViewerEnabled === false) return Promise.reject(new Error("no viewer"));
  return new Promise((resolve, reject) => {
    const address = URL.createObjectURL(file);
    const frame = document.createElement("iframe");
    // Hidden, but laid out: a frame that is not displayed prints an empty sheet.
    frame.style.cssText = "position:fixed;inset-inline-end:100%;width:1px;height:1px;border:0";
    frame.title = file.name;
    frame.tabIndex = -1;
    frame.setAttribute("aria-hidden", "true");
    const clear = () => {
      frame.remove();
      URL.revokeObjectURL(address);
    };
    const refused = setTimeout(() => {
      clear();
      reject(new Error("the frame stayed empty"));
    }, FILLED_WITHIN_MS);
    frame.onload = () => {
      clearTimeout(refused);
      try {
        frame.contentWindow!.focus();
        frame.contentWindow!.print();
        setTimeout(clear, SEEN_BY_PRINTER_MS);
        resolve();
      } catch (error) {
        clear();
        reject(error);
      }
    };
    frame.src = address;
    document.body.append(frame);
  });
}
