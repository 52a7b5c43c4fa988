import { type RefObject, useEffect, useRef } from 'react';
import { reducedMotion } from '../overlay/reducedMotion.ts';

/** Once to and fro, s: slow enough to follow with the eye. */
const PERIOD = 2.6;

/** Where in its swing a shape is, −1 to 1, in a ref that `step` is called after each change of. At rest, or where little motion is wanted, 1. */
export function useSwing(playing: boolean, step: RefObject<() => void>): RefObject<number> {
  const swing = useRef(1);
  useEffect(() => {
    if (!playing || reducedMotion()) {
      swing.current = 1;
      step.current();
      return;
    }
    let frame = 0;
    const begun = performance.now();
    const next = (now: number): void => {
      swing.current = Math.cos((2 * Math.PI * (now - begun)) / 1000 / PERIOD);
      step.current();
      frame = requestAnimationFrame(next);
    };
    frame = requestAnimationFrame(next);
    return () => {
      cancelAnimationFrame(frame);
      swing.current = 1;
    };
  }, [playing, step]);
  return swing;
}
