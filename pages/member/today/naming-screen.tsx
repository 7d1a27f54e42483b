import { useEffect, useRef, useState } from 'react';
import { type GridKey, KeyGrid } from '#renderer/ui/index.ts';
import type { AnswerKey } from '#shared/contracts/today.ts';
import { aufText } from '#shared/text/auf.ts';
import { todayText } from '#shared/text/today.ts';
import { firstMoves } from './first-moves.ts';
import { readTyped, type TypedName } from './type-ahead.ts';
import type { Choice } from './use-sitting.ts';

export interface NamingScreenProps {
  readonly keys: readonly AnswerKey[];
  /** 'all' names of a set, or those of one cluster. */
  readonly grid: string;
  readonly asksAuf: boolean;
  readonly recognitionMs: number;
  readonly onChoose: (choice: Choice) => void;
}

const SOLVED = 'solved';
const LOST = 'lost';
const SLOW_MS = 5_000;
/** A pause longer than this begins a new name. */
const TYPING_MS = 900;

/** The fixed grid of names, then the AUF before. By touch, by arrows and Enter, or by typing. */
export function NamingScreen({ keys, grid, asksAuf, recognitionMs, onChoose }: NamingScreenProps) {
  const beganAt = useRef(0);
  const chosen = useRef(false);
  const typed = useRef({ letters: '', at: 0 });
  const justTyped = useRef(false);
  const caseGrid = useRef<HTMLDivElement>(null);
  const aufGrid = useRef<HTMLDivElement>(null);
  const [picked, setPicked] = useState<AnswerKey | null>(null);
  const slow = useSlow(SLOW_MS);
  const whole = grid === 'all';
  const gridKeys = whole ? wholeGrid(keys) : clusterGrid(keys);
  const names: TypedName[] = gridKeys.map((key) => ({
    value: key.value,
    text: key.value === SOLVED || key.value === LOST ? (key.text ?? '') : labelOf(keys, key.value),
    isName: !key.plain,
  }));

  // Where a club has names of its own, the trade's are understood too.
  const tradeNames = names.map((name) => ({
    ...name,
    text: keys.find((key) => key.key === name.value)?.tradeName ?? name.text,
  }));
  const read = (letters: string) => {
    const own = readTyped(names, letters);
    return own.kind === 'none' ? readTyped(tradeNames, letters) : own;
  };

  useEffect(() => {
    beganAt.current = performance.now();
    focusKey(caseGrid.current, 0);
  }, []);
  useEffect(() => {
    if (picked) focusKey(aufGrid.current, 0);
  }, [picked]);

  const send = (named: string, aufBefore: number | null) => {
    if (chosen.current) return;
    chosen.current = true;
    const namingMs = Math.max(0, Math.round(performance.now() - beganAt.current));
    onChoose({ named, aufBefore, recognitionMs, namingMs });
  };
  const pick = (value: string) => {
    const key = keys.find((one) => one.key === value);
    if (!asksAuf || value === SOLVED || value === LOST || !key) send(value, null);
    else setPicked(key);
  };

  const onKey = useRef<(event: KeyboardEvent) => void>(() => {});
  onKey.current = (event) => {
    if (event.repeat || event.altKey || event.ctrlKey || event.metaKey) return;
    // Enter after a typed name closes the name; the AUF it would land on has not been looked at yet.
    const closesName = event.key === 'Enter' && justTyped.current;
    justTyped.current = false;
    if (closesName) {
      event.preventDefault();
      event.stopPropagation();
      return;
    }
    if (!/^[\p{L}\p{N}]$/u.test(event.key)) return;
    if (picked && /^[0-3]$/.test(event.key)) send(picked.key, Number(event.key));
    else type(event.key, event.timeStamp);
    // The grid's own jump to the next key with that letter would be a second meaning.
    event.preventDefault();
    event.stopPropagation();
  };
  const type = (letter: string, at: number) => {
    const before = at - typed.current.at < TYPING_MS ? typed.current.letters : '';
    const longer = read(before + letter);
    const letters = longer.kind === 'none' ? letter : before + letter;
    const meant = longer.kind === 'none' ? read(letter) : longer;
    typed.current = { letters: meant.kind === 'pick' ? '' : letters, at };
    if (meant.kind === 'none') return;
    focusKey(caseGrid.current, meant.index);
    if (meant.kind !== 'pick') return;
    justTyped.current = true;
    pick(names[meant.index]?.value ?? '');
  };
  useEffect(() => {
    const listener = (event: KeyboardEvent) => onKey.current(event);
    window.addEventListener('keydown', listener, true);
    return () => window.removeEventListener('keydown', listener, true);
  }, []);

  return (
    <div className="flex flex-1 flex-col gap-5 py-4">
      <div ref={caseGrid}>
        <KeyGrid
          legend={todayText.caseLegend}
          keys={gridKeys}
          columns={whole ? 4 : 3}
          value={picked?.key ?? null}
          onPick={pick}
        />
      </div>
      {picked && (
        <div ref={aufGrid}>
          <KeyGrid
            legend={todayText.aufLegend}
            hint={todayText.aufFor(firstMoves(picked.algorithm))}
            keys={aufText.names.map((label, turns) => ({ value: String(turns), label }))}
            columns={4}
            value={null}
            onPick={(turns) => send(picked.key, Number(turns))}
          />
        </div>
      )}
      <p role="status" className="text-[0.9375rem] text-ink-2">
        {slow ? todayText.slowNaming : ''}
      </p>
      <p className="sr-only text-[0.9375rem] text-ink-2 lg:not-sr-only">{todayText.keysHint}</p>
    </div>
  );
}

function useSlow(afterMs: number): boolean {
  const [slow, setSlow] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setSlow(true), afterMs);
    return () => clearTimeout(timer);
  }, [afterMs]);
  return slow;
}

/** What the club calls a case, and small below it the trade's name. */
function TwoNames({ of }: { of: AnswerKey }) {
  return (
    <span className="min-w-0 py-1 break-words">
      <span className="block">{of.label}</span>{' '}
      <span className="block text-[0.8125rem] font-normal">{of.tradeName}</span>
    </span>
  );
}

/** All names of a set, four in a row, then "solved" and "lost it". */
function wholeGrid(keys: readonly AnswerKey[]): GridKey[] {
  return [
    ...keys.map((key) =>
      key.key === SOLVED
        ? { value: SOLVED, label: todayText.solved, text: todayText.solved, plain: true }
        : key.tradeName === null
          ? { value: key.key, label: key.label }
          : {
              value: key.key,
              text: todayText.alsoCalled(key.label, key.tradeName),
              label: <TwoNames of={key} />,
            },
    ),
    lostKey(keys.length, 4),
  ];
}

/** The names of a cluster with the first moves of their algorithms, three in a row. */
function clusterGrid(keys: readonly AnswerKey[]): GridKey[] {
  return [
    ...keys.map((key) => ({
      value: key.key,
      text: `${key.tradeName === null ? key.label : todayText.alsoCalled(key.label, key.tradeName)} ${firstMoves(key.algorithm)}`,
      label: (
        <span className="py-1">
          <span className="block">{key.label}</span>{' '}
          <span translate="no" className="block text-[0.8125rem] font-normal">
            {firstMoves(key.algorithm)}
          </span>
        </span>
      ),
    })),
    lostKey(keys.length, 3),
  ];
}

/** "lost it", over two places where the last row has them. */
function lostKey(before: number, columns: number): GridKey {
  const rest = columns - (before % columns);
  return {
    value: LOST,
    label: todayText.lost,
    text: todayText.lost,
    plain: true,
    span: rest >= 2 ? 2 : 1,
  };
}

function labelOf(keys: readonly AnswerKey[], value: string): string {
  return keys.find((key) => key.key === value)?.label ?? '';
}

function focusKey(grid: HTMLElement | null, index: number): void {
  grid?.querySelectorAll('button')[index]?.focus({ preventScroll: true });
}
