import { keepPreviousData, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { Problem } from '#shared/contracts/common.ts';
import { type Call, call, callKey, type Endpoint, fillPath } from '#shared/contracts/endpoint.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { apiText } from '#shared/text/api.ts';

/** A refusal of the server's (problem details), or status 0: no answer came. */
export class ApiError extends Error {
  readonly status: number;
  readonly problem: Problem | null;

  constructor(status: number, problem: Problem | null) {
    super(problem?.detail ?? (status === 0 ? apiText.noAnswer : apiText.broken));
    this.name = 'ApiError';
    this.status = status;
    this.problem = problem;
  }
}

async function request(method: string, path: string, body: unknown): Promise<Response> {
  try {
    return await fetch(path, {
      method,
      credentials: 'same-origin',
      headers:
        body === undefined
          ? { Accept: 'application/json' }
          : { Accept: 'application/json', 'Content-Type': 'application/json' },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch {
    throw new ApiError(0, null);
  }
}

/** One renewal at a time: parallel calls that meet a run-out token wait for the same one. */
let renewal: Promise<boolean> | null = null;
function renewSession(): Promise<boolean> {
  renewal ??= request('POST', endpoints.refreshSession.path, {})
    .then((res) => res.ok)
    .finally(() => {
      renewal = null;
    });
  return renewal;
}

/**
 * Makes a call. A token that has run out is renewed once on the way.
 * @throws ApiError
 */
export async function send<I, O>({ endpoint, input }: Call<I, O>): Promise<O> {
  const { path, rest } = fillPath(endpoint.path, (input ?? {}) as Record<string, unknown>);
  const isGet = endpoint.method === 'GET';
  const query = isGet
    ? new URLSearchParams(
        Object.entries(rest)
          .filter(([, v]) => v !== undefined)
          .map(([k, v]) => [k, String(v)]),
      )
    : null;
  const url = query && query.size > 0 ? `${path}?${query}` : path;
  const body = isGet ? undefined : rest;
  let res = await request(endpoint.method, url, body);
  if (res.status === 401 && endpoint.name !== 'signIn' && (await renewSession())) {
    res = await request(endpoint.method, url, body);
  }
  if (res.ok) return (await res.json()) as O;
  const problem = (await res.json().catch(() => null)) as Problem | null;
  throw new ApiError(res.status, problem);
}

/**
 * Reads an endpoint: on the server and right after it, the answer is there already. With `keepWhileLoading` the
 * answer to the input before stays until the new one is there: for filters, which would make the page flicker.
 */
export function useCall<I, O>(
  endpoint: Endpoint<I, O>,
  input: I,
  { keepWhileLoading = false }: { keepWhileLoading?: boolean } = {},
) {
  const c = call(endpoint, input);
  return useQuery<O, ApiError>({
    queryKey: callKey(c as Call<unknown, unknown>),
    queryFn: () => send(c),
    placeholderData: keepWhileLoading ? keepPreviousData : undefined,
  });
}

/** Writes through an endpoint; `onDone` usually puts the answer into the cache with `useStore`. */
export function useSend<I, O>(
  endpoint: Endpoint<I, O>,
  options: { onDone?: (output: O, input: I) => void } = {},
) {
  return useMutation<O, ApiError, I>({
    mutationFn: (input) => send(call(endpoint, input)),
    ...(options.onDone ? { onSuccess: options.onDone } : {}),
  });
}

/** Puts an answer into the cache, or marks one as to be read again. */
export function useStore() {
  const client = useQueryClient();
  return {
    put<I, O>(endpoint: Endpoint<I, O>, input: I, output: O) {
      client.setQueryData(callKey(call(endpoint, input) as Call<unknown, unknown>), output);
    },
    refresh(endpoint: Endpoint<unknown, unknown>) {
      return client.invalidateQueries({ queryKey: [endpoint.name] });
    },
  };
}
