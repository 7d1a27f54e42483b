import { usePageContext } from '#renderer/page-context-provider.tsx';
import { PublicFrame } from '#renderer/public-frame.tsx';
import { BigNumber, LinkButton } from '#renderer/ui/index.ts';
import { frontText } from '#shared/text/front.ts';
import { shellText } from '#shared/text/shell.ts';

export function Page() {
  const { home } = usePageContext().data as { home: string | null };
  return (
    <PublicFrame home={home}>
      <h1 className="max-w-3xl text-4xl font-bold leading-tight sm:text-5xl">{frontText.title}</h1>
      <p className="mt-5 max-w-prose text-xl leading-relaxed text-ink-2">{frontText.lead}</p>
      <p className="mt-8">
        <LinkButton href={home ?? '/sign-in'}>{home ? frontText.open : shellText.signIn}</LinkButton>
      </p>
      <dl className="mt-12 flex flex-wrap gap-x-14 gap-y-6 border-t-[1.5px] border-ink pt-6">
        {frontText.counts.map(({ number, label }) => (
          <BigNumber key={label} value={number} label={label} />
        ))}
      </dl>
      <div className="mt-10 grid gap-8 border-t border-hair pt-8 sm:grid-cols-3">
        {frontText.roles.map(({ who, what }) => (
          <section key={who}>
            <h2 className="text-xl font-bold">{who}</h2>
            <p className="mt-2 leading-relaxed text-ink-2">{what}</p>
          </section>
        ))}
      </div>
    </PublicFrame>
  );
}
