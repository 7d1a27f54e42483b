export interface AlgorithmTextProps {
  /** Moves as stored, with ASCII apostrophes. */
  readonly text: string;
  /** Where a wrong part begins, from 1, and how many characters it has; shown on rose. */
  readonly wrong?: { readonly column: number; readonly length: number };
  readonly className?: string;
}

/** Primes as they are printed. */
export function printedAlgorithm(text: string): string {
  return text.replaceAll("'", '′');
}

/** An algorithm in print; a part that is not a move stands out and is marked for everyone. */
export function AlgorithmText({ text, wrong, className }: AlgorithmTextProps) {
  const start = wrong ? Math.max(0, wrong.column - 1) : text.length;
  const end = wrong ? start + Math.max(1, wrong.length) : text.length;
  return (
    <span translate="no" className={className}>
      {printedAlgorithm(text.slice(0, start))}
      {wrong && (
        <mark className="bg-rose-weak px-0.5 text-ink">{printedAlgorithm(text.slice(start, end))}</mark>
      )}
      {printedAlgorithm(text.slice(end))}
    </span>
  );
}
