import { expect, it } from 'vitest';
import { stepAfter } from '#pages/catalogue/case/step-keys.ts';

const plain = { altKey: false, ctrlKey: false, metaKey: false, shiftKey: false };
const press = (key: string, focus: 'steps' | 'page', at: number) =>
  stepAfter({ ...plain, key }, focus, at, 7);

it('arrows step from the steps and from the page alike, no further than the ends', () => {
  for (const focus of ['steps', 'page'] as const) {
    expect(press('ArrowRight', focus, 3)).toBe(4);
    expect(press('ArrowLeft', focus, 3)).toBe(2);
    expect(press('ArrowRight', focus, 7)).toBe(7);
    expect(press('ArrowLeft', focus, 0)).toBe(0);
  }
});

it('Home and End go to the ends from the steps; else they stay with the page', () => {
  expect(press('Home', 'steps', 3)).toBe(0);
  expect(press('End', 'steps', 3)).toBe(7);
  expect(press('Home', 'page', 3)).toBeNull();
  expect(press('End', 'page', 3)).toBeNull();
});

it('leaves every other key, and keys held with another, alone', () => {
  for (const key of ['ArrowUp', 'ArrowDown', ' ', 'a']) expect(press(key, 'page', 3)).toBeNull();
  for (const held of ['altKey', 'ctrlKey', 'metaKey', 'shiftKey'])
    expect(stepAfter({ ...plain, [held]: true, key: 'ArrowRight' }, 'steps', 3, 7)).toBeNull();
});
