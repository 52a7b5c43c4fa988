import { type RefObject, useEffect, useRef } from 'react';
import { reducedMotion } from './reducedMotion.ts';

/** It grows, then breathes a few times and rests, in under five seconds: a moving drawing is hard to read. s. */
const GROWS = 0.6;
const BREATH = 1.3;
const BREATHS = 3;

/**
 * How far the bow has grown, from 0 to a little over 1, in a ref that `step` is called after each change of. At rest, or where little motion is wanted, 1.
 *
 * @param bowed changes when another bow is shown; null when none is
 */
export function useBowGrowth(bowed: string | null, step: RefObject<() => void>): RefObject<number> {
  const grown = useRef(1);
  useEffect(() => {
    if (bowed === null || reducedMotion()) {
      grown.current = 1;
      return;
    }
    let frame = 0;
    const begun = performance.now();
    const next = (now: number): void => {
      const t = (now - begun) / 1000;
      grown.current = growth(t);
      step.current();
      if (t < GROWS + BREATHS * BREATH) frame = requestAnimationFrame(next);
    };
    frame = requestAnimationFrame(next);
    return () => {
      cancelAnimationFrame(frame);
      grown.current = 1;
    };
  }, [bowed, step]);
  return grown;
}

/** The bow's growth after t seconds. */
export function growth(t: number): number {
  if (t >= GROWS + BREATHS * BREATH) return 1;
  if (t >= GROWS) return 1 - 0.06 * Math.sin((2 * Math.PI * (t - GROWS)) / BREATH);
  const part = Math.max(0, t / GROWS);
  return 1 - (1 - part) ** 3;
}
