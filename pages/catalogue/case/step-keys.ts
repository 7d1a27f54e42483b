type Pressed = Pick<KeyboardEvent, 'key' | 'altKey' | 'ctrlKey' | 'metaKey' | 'shiftKey'>;

const ARROWS: Readonly<Record<string, number>> = { ArrowLeft: -1, ArrowRight: 1 };

/**
 * The step 0..last that a key leads to from step `at`; null where the key is not for stepping. Among the steps
 * Home and End go to the ends; where nothing has the focus they stay the page's own, and the arrows alone step.
 */
export function stepAfter(
  { key, altKey, ctrlKey, metaKey, shiftKey }: Pressed,
  focus: 'steps' | 'page',
  at: number,
  last: number,
): number | null {
  if (altKey || ctrlKey || metaKey || shiftKey) return null;
  const by = ARROWS[key];
  if (by !== undefined) return Math.max(0, Math.min(last, at + by));
  if (focus === 'page') return null;
  return key === 'Home' ? 0 : key === 'End' ? last : null;
}
