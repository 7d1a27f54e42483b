import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ApiError } from '#renderer/api.ts';
import { EmptyState, ErrorState, LoadingState } from '#renderer/ui/index.ts';
import { deskText } from '#shared/text/desk.ts';

/** What a desk screen shows while its figures are on the way, when they did not come, and when there are none. */
export function Awaited<T>({
  query,
  children,
}: {
  query: UseQueryResult<T, ApiError>;
  children: (data: T) => ReactNode;
}) {
  if (query.data !== undefined) return <>{children(query.data)}</>;
  if (!query.isError) return <LoadingState label={deskText.loading} />;
  if (query.error.status === 404) return <EmptyState title={query.error.message} />;
  return (
    <div className="py-6">
      <ErrorState
        title={deskText.cannotLoad}
        retryLabel={deskText.retry}
        onRetry={() => void query.refetch()}
      >
        <p>{query.error.message}</p>
      </ErrorState>
    </div>
  );
}
