/** The first stop on a page: jumps over the navigation. `target` is the id of the main element. */
export function SkipLink({ target = 'content', label }: { target?: string; label: string }) {
  return (
    <a
      href={`#${target}`}
      className="sr-only focus:not-sr-only focus:fixed focus:left-2 focus:top-2 focus:z-20 focus:bg-ink focus:px-4 focus:py-3 focus:text-paper"
    >
      {label}
    </a>
  );
}
