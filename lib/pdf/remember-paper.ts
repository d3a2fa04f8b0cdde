/** The paper chosen last, kept by this browser alone. */

/** Nothing where the browser keeps nothing. */
export function rememberedPaper(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

export function rememberPaper(key: string, paper: string): void {
  try {
    localStorage.setItem(key, paper);
  } catch {
    // Then it is asked for again next time.
  }
}
