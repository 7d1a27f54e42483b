import type { ReactNode } from 'react';
import { cx } from './cx.ts';
import { AppLink } from './link.tsx';
import { Mark } from './mark.tsx';
import { SkipLink } from './skip-link.tsx';

export interface NavItem {
  readonly href: string;
  readonly label: string;
  readonly current?: boolean;
}

export interface TopBarProps {
  /** The product's name, beside the mark. */
  readonly product: string;
  readonly homeHref: string;
  /** Names the navigation for assistive technology. */
  readonly navigationLabel: string;
  /** The first stop: jumps to the element with the id `content`. */
  readonly skipLabel: string;
  readonly items: readonly NavItem[];
  /** Who is here, club and role; switching club, signing out. */
  readonly aside?: ReactNode;
}

/** The bar over desk, administration and public pages; on narrow screens its links stand in more lines than one. */
export function TopBar({ product, homeHref, navigationLabel, skipLabel, items, aside }: TopBarProps) {
  return (
    <header className="rule-b screen-only px-4 sm:px-8">
      <SkipLink label={skipLabel} />
      <div className="flex flex-wrap items-stretch justify-between gap-x-6">
        <AppLink
          href={homeHref}
          className="flex min-h-12 items-center gap-3 py-1 text-lg font-bold sm:min-h-14 sm:gap-6"
        >
          <Mark />
          {product}
        </AppLink>
        {items.length > 0 && (
          <nav aria-label={navigationLabel} className="order-3 w-full sm:order-none sm:w-auto sm:flex-1">
            <ul className="flex h-full flex-wrap items-stretch gap-x-5 sm:gap-x-6">
              {items.map((item) => (
                <li key={item.href} className="flex">
                  <AppLink
                    href={item.href}
                    aria-current={item.current ? 'page' : undefined}
                    className={cx(
                      'flex min-h-12 items-center whitespace-nowrap pt-1',
                      item.current
                        ? 'border-b-4 border-ink font-bold text-ink'
                        : 'pb-1 text-ink-2 hover:text-ink hover:underline',
                    )}
                  >
                    {item.label}
                  </AppLink>
                </li>
              ))}
            </ul>
          </nav>
        )}
        {aside && (
          <div className="flex min-h-12 flex-wrap items-center gap-x-4 text-sm text-ink-2">{aside}</div>
        )}
      </div>
    </header>
  );
}
