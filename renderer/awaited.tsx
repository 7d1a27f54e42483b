import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { shellText } from '#shared/text/shell.ts';
import type { ApiError } from './api.ts';
import { EmptyState, ErrorState, LoadingState } from './ui/index.ts';

/** What a screen shows while its data is on the way, when it did not come, and when there is none such. */
export function Awaited<T>({
  query,
  missing,
  loading = shellText.loading,
  failed = shellText.couldNotLoad,
  children,
}: {
  query: UseQueryResult<T, ApiError>;
  /** Said for an address that names nothing; the server's sentence unless given. */
  missing?: string;
  loading?: string;
  failed?: string;
  children: (data: T) => ReactNode;
}) {
  if (query.data !== undefined) return <>{children(query.data)}</>;
  const { error } = query;
  if (query.isPending || !error) return <LoadingState label={loading} />;
  if (error.status === 404 || error.status === 400) {
    return (
      <div className="py-8">
        <EmptyState title={missing ?? error.message} />
      </div>
    );
  }
  return (
    <div className="py-8">
      <ErrorState title={failed} retryLabel={shellText.tryAgain} onRetry={() => void query.refetch()}>
        <p>{error.message}</p>
      </ErrorState>
    </div>
  );
}
