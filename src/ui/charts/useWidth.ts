import { type RefObject, useLayoutEffect, useState } from "react";
import { flushSync } from "react-dom";

const unmeasured = 720;
/** Width between the margins of A4, the narrower of the two papers, px. */
const onPaper = 680;

/** Width of an element in whole pixels, followed as it changes; that of the paper while printing; a fixed one where nothing is laid out. */
export function useWidth(ref: RefObject<HTMLElement | null>): number {
  const [width, setWidth] = useState(unmeasured);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null) return;
    let printing = false;
    const measure = () => setWidth(printing ? onPaper : Math.floor(element.clientWidth) || unmeasured);
    const before = () => {
      printing = true;
      flushSync(measure);
    };
    const after = () => {
      printing = false;
      measure();
    };
    measure();
    window.addEventListener("beforeprint", before);
    window.addEventListener("afterprint", after);
    const observer = typeof ResizeObserver === "undefined" ? null : new ResizeObserver(measure);
    observer?.observe(element);
    return () => {
      window.removeEventListener("beforeprint", before);
      window.removeEventListener("afterprint", after);
      observer?.disconnect();
    };
  }, [ref]);
  return width;
}
