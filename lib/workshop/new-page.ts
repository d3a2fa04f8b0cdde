/** Begins the app again at `path` as a whole new page: nothing of a book that went may stay in memory. */
export function newPage(path: string): void {
  location.assign(path);
}
