/** Takes everything of a book off this phone; the app itself stays. */
import { delMany, keys } from "idb-keyval";
import { openBook } from "@/lib/store/book";
import { dropAllDrafts } from "@/lib/store/drafts";
import { screensStore } from "@/lib/store/screens-store";

/** Drops the screens of every other book; they may have been written once more while that one was being cleared. */
export async function forgetOtherScreens(book: string): Promise<void> {
  const held = await keys<string>(screensStore);
  await delMany(
    held.filter((key) => !String(key).endsWith(`/${book}`)),
    screensStore,
  );
}

/** @throws KeepProblem, with nothing cleared. The page must begin again afterwards. */
export async function clearPhone(): Promise<void> {
  const book = openBook();
  await book.startAnew();
  await dropAllDrafts();
  sessionStorage.clear();
  await forgetOtherScreens((await book.head()).book);
  book.tellBookChanged();
}
