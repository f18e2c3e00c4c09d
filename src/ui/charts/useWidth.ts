import { type RefObject, useLayoutEffect, useState } from "react";

const unmeasured = 720;

/** Width of an element in whole pixels, followed as it changes; a fixed width where nothing is laid out. */
export function useWidth(ref: RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(unmeasured);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null) return;
    const measure = () => setWidth(Math.floor(element.clientWidth) || unmeasured);
    measure();
    if (typeof ResizeObserver === "undefined") return;
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref]);
  return width;
}
