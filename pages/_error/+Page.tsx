import { usePageContext } from '#renderer/page-context-provider.tsx';
import { PublicFrame } from '#renderer/public-frame.tsx';
import { problemPageText, shellText } from '#shared/text/shell.ts';

export function Page() {
  const pageContext = usePageContext();
  const status = pageContext.is404 ? 404 : (pageContext.abortStatusCode ?? 500);
  const home = (pageContext.data as { home: string | null } | undefined)?.home ?? null;
  const reason = typeof pageContext.abortReason === 'string' ? pageContext.abortReason : null;
  return (
    <PublicFrame home={home}>
      <h1 className="text-3xl font-bold">{problemPageText.titleOf(status)}</h1>
      <p className="mt-4 max-w-prose text-lg text-ink-2">{reason ?? problemPageText.detailOf(status)}</p>
      <p className="mt-6">
        <a className="text-link underline" href={home ?? '/'}>
          {home ? shellText.openPlaces : problemPageText.home}
        </a>
      </p>
    </PublicFrame>
  );
}
