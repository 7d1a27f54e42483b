const percent = (share: number): string => `${(Math.min(1, Math.max(0, share)) * 100).toFixed(2)}%`;

/** An axis from 0 to 1: a quiet tick where a share stood, an ink tick where it stands now, a bar between. */
export function MoveBar({ before, now }: { before: number; now: number }) {
  return (
    <svg aria-hidden="true" focusable="false" width="100%" height="16" className="block overflow-visible">
      <line x1="0" x2="100%" y1="8" y2="8" strokeWidth="1" className="stroke-line" />
      <line x1={percent(before)} x2={percent(now)} y1="8" y2="8" strokeWidth="5" className="stroke-bar" />
      <line
        x1={percent(before)}
        x2={percent(before)}
        y1="3"
        y2="13"
        strokeWidth="1.5"
        className="stroke-ink-2"
      />
      <line
        x1={percent(now)}
        x2={percent(now)}
        y1="1"
        y2="15"
        strokeWidth="3"
        className="figure-ink stroke-ink"
      />
    </svg>
  );
}
