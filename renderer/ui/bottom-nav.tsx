import { cx } from './cx.ts';
import { AppLink } from './link.tsx';
import type { NavItem } from './top-bar.tsx';

/** The member's places, under the thumb: kept at the bottom edge, a thick rule over the current one. */
export function BottomNav({ label, items }: { label: string; items: readonly NavItem[] }) {
  return (
    <nav
      aria-label={label}
      className="rule-t screen-only sticky bottom-0 z-10 bg-paper pb-[env(safe-area-inset-bottom)]"
    >
      <ul className="mx-auto flex max-w-2xl">
        {items.map((item) => (
          <li key={item.href} className="min-w-0 flex-1">
            <AppLink
              href={item.href}
              aria-current={item.current ? 'page' : undefined}
              className={cx(
                'flex min-h-14 items-center justify-center px-1 pb-1 text-center text-[0.9375rem]',
                item.current ? 'border-t-[5px] border-ink font-bold text-ink' : 'pt-[5px] text-ink-2',
              )}
            >
              {item.label}
            </AppLink>
          </li>
        ))}
      </ul>
    </nav>
  );
}
