/** Card in daylight, navy paper at night, or as the phone has it. Kept by the browser, outside the book. */

export type Theme = "phone" | "light" | "dark";

const KEY = "notchbook-theme";

/** Where the browser keeps nothing, the phone's own theme stands. */
function stored(): string | null {
  try {
    return localStorage.getItem(KEY);
  } catch {
    return null;
  }
}

export function chosenTheme(): Theme {
  const held = stored();
  return held === "light" || held === "dark" ? held : "phone";
}

const listeners = new Set<() => void>();

export function subscribeTheme(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function chooseTheme(theme: Theme): void {
  try {
    if (theme === "phone") localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, theme);
  } catch {
    // It then holds until Notchbook is closed.
  }
  showTheme(theme);
  for (const listener of listeners) listener();
}

/** Puts the theme on the page, and on the browser's own bar. */
export function showTheme(theme: Theme): void {
  const root = document.documentElement;
  if (theme === "phone") delete root.dataset.theme;
  else root.dataset.theme = theme;
  const metas = [...document.querySelectorAll<HTMLMetaElement>('meta[name="theme-color"]')];
  for (const meta of metas) {
    // Each says for which of the phone's themes it is; a theme chosen here goes before both.
    meta.dataset.of ??= meta.media.includes("dark") ? "dark" : "light";
    meta.dataset.own ??= meta.content;
  }
  for (const meta of metas) {
    const wanted = theme === "phone" ? meta.dataset.of : theme;
    meta.content = metas.find(({ dataset }) => dataset.of === wanted)?.dataset.own ?? meta.content;
  }
}

/**
 * Runs in the page's head, before anything is painted or loaded: the chosen theme, and the browser's offer to install,
 * which comes once and early.
 */
export const earlyScript = `(function(){try{var t=localStorage.getItem(${JSON.stringify(KEY)});if(t==="light"||t==="dark")document.documentElement.dataset.theme=t}catch(e){}addEventListener("beforeinstallprompt",function(e){e.preventDefault();window.notchbookInstall=e;dispatchEvent(new Event("notchbook-install"))})})()`;
