"use client";

import { type RefCallback, useCallback, useState } from "react";
import { type Size } from "@/lib/sleeves/drawing-view";

/** The size of an element in px, null until it is known; kept up with as it changes. */
export function useSize<T extends Element>(): [RefCallback<T>, Size | null] {
  const [size, setSize] = useState<Size | null>(null);
  const ref = useCallback((element: T | null) => {
    if (!element) return;
    const read = () => {
      const { height, width } = element.getBoundingClientRect();
      setSize((before) =>
        before && before.width === width && before.height === height ? before : { width, height },
      );
    };
    read();
    const observer = new ResizeObserver(read);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, size];
}
