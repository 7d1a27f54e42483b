import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { ApiError } from '#renderer/api.ts';
import { EmptyState, ErrorState, LoadingState } from '#renderer/ui/index.ts';
import { adminText } from '#shared/text/admin.ts';

/** What a screen shows while its data is on the way, when it did not come, and when there is none such. */
export function Awaited<T>({
  query,
  loading = adminText.loading,
  failed = adminText.couldNotLoad,
  children,
}: {
  query: UseQueryResult<T, ApiError>;
  loading?: string;
  failed?: string;
  children: (data: T) => ReactNode;
}) {
  if (query.data !== undefined) return <>{children(query.data)}</>;
  const { error } = query;
  if (query.isPending || !error) return <LoadingState label={loading} />;
  // An address that names nothing, whether it could have or not.
  if (error.status === 404 || error.status === 400) {
    return (
      <div className="py-8">
        <EmptyState title={error.message} />
      </div>
    );
  }
  return (
    <div className="py-8">
      <ErrorState title={failed} retryLabel={adminText.tryAgain} onRetry={() => void query.refetch()}>
        <p>{error.message}</p>
      </ErrorState>
    </div>
  );
}
