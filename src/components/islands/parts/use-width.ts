import { type RefObject, useEffect, useRef, useState } from "react";

/** The width of a box in whole pixels, followed; 0 before it is measured. */
export function useWidth<T extends HTMLElement>(): [RefObject<T | null>, number] {
  const box = useRef<T>(null);
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const element = box.current;
    if (!element) return;
    const measure = () => setWidth(Math.floor(element.getBoundingClientRect().width));
    measure();
    const sized = new ResizeObserver(measure);
    sized.observe(element);
    return () => sized.disconnect();
  }, []);
  return [box, width];
}
