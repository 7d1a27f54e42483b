/** How far a longer piece of work is: `value` of `max`, or unknown when null. */
export function ProgressBar({ label, value, max }: { label: string; value: number | null; max: number }) {
  return (
    <div>
      <div className="flex justify-between text-sm text-ink-2">
        <span>{label}</span>
        {value !== null && max > 0 && <span aria-hidden="true">{Math.floor((100 * value) / max)}%</span>}
      </div>
      <progress aria-label={label} max={max} value={value ?? undefined} className="progress" />
    </div>
  );
}
