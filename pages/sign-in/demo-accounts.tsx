import type { DemoAccount, SignInInput } from '#shared/contracts/session.ts';
import { frontText } from '#shared/text/front.ts';

const text = frontText.signIn;

/** Demonstration only: the invented people one can sign in as. */
export function DemoAccounts({
  accounts,
  onUse,
}: {
  accounts: readonly DemoAccount[];
  onUse(values: SignInInput): void;
}) {
  return (
    <section>
      <h2 className="text-xl font-bold">{text.demoTitle}</h2>
      <p className="mt-1 text-ink-2">{text.demoLead}</p>
      <ul className="mt-4 border-t-[1.5px] border-ink">
        {accounts.map(({ signIn, password, who }) => (
          <li key={signIn} className="grid grid-cols-[1fr_auto] gap-x-4 border-b border-hair py-3">
            <span className="font-bold">{who}</span>
            <button
              type="button"
              className="row-span-2 min-h-12 min-w-12 cursor-pointer text-link underline underline-offset-4"
              aria-label={text.demoUse(who)}
              onClick={() => onUse({ signIn, password })}
            >
              {text.use}
            </button>
            <span className="break-words text-ink-2">
              {signIn} · {password}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
