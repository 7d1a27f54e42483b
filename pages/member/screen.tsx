import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ApiError } from '#renderer/api.ts';
import { EmptyState, ErrorState, LoadingState, ScreenHead } from '#renderer/ui/index.ts';
import { memberText } from '#shared/text/member.ts';

/** A member's screen: head and content, in a column as wide as its content needs. */
export function MemberScreen({
  title,
  aside,
  wide = false,
  children,
}: {
  title: string;
  aside?: ReactNode;
  wide?: boolean;
  children: ReactNode;
}) {
  return (
    <div className={`mx-auto w-full flex-1 px-[18px] pb-10 ${wide ? 'max-w-6xl' : 'max-w-3xl'}`}>
      <ScreenHead title={title} aside={aside} />
      {children}
    </div>
  );
}

/** What a screen shows while its data is on the way, when it did not come, and when there is none such. */
export function Awaited<T>({
  query,
  missing,
  children,
}: {
  query: UseQueryResult<T, ApiError>;
  missing?: string;
  children: (data: T) => ReactNode;
}) {
  if (query.data !== undefined) return <>{children(query.data)}</>;
  if (query.isPending) return <LoadingState label={memberText.loading} />;
  if (query.error?.status === 404 && missing) return <EmptyState title={missing} />;
  return (
    <div className="py-6">
      <ErrorState
        title={memberText.couldNotLoad}
        retryLabel={memberText.tryAgain}
        onRetry={() => void query.refetch()}
      >
        <p>{query.error?.message}</p>
      </ErrorState>
    </div>
  );
}
