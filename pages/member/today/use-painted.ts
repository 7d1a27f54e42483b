import { type RefObject, useEffect, useRef } from 'react';

/**
 * When this component's first picture was on the screen, by performance.now(); null before. The second frame
 * after the commit begins when the first has been painted. A hidden page paints nothing, and its clock waits.
 */
export function usePainted(): RefObject<number | null> {
  const paintedAt = useRef<number | null>(null);
  useEffect(() => {
    let frame = requestAnimationFrame(() => {
      frame = requestAnimationFrame(() => {
        paintedAt.current = performance.now();
      });
    });
    return () => cancelAnimationFrame(frame);
  }, []);
  return paintedAt;
}
