/** Where the rows of the screens last looked at are kept, each book's under its name, so that a start shows them at once. */
import { createStore, type UseStore } from "idb-keyval";

let store: UseStore | undefined;

/** Opened at the first use: not while a page is made on the server. */
export const screensStore: UseStore = (mode, use) => {
  store ??= createStore("notchbook-screens", "screens");
  return store(mode, use);
};
