/**
 * What the browser needs to know of an endpoint: method, path, and (as types only) input and output. The
 * schemas stand in the contract files beside this one and are read by the server; the compiler holds the two
 * together, and the browser carries no schema library.
 */
export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

export interface Endpoint<Input, Output> {
  readonly name: string;
  readonly method: Method;
  /** With `:name` places, filled from the input; what is left of it goes to the query (GET) or the body. */
  readonly path: string;
  /** Types only; never set. */
  readonly types?: { input: Input; output: Output };
}

export function endpoint<Input, Output>(name: string, method: Method, path: string): Endpoint<Input, Output> {
  return { name, method, path };
}

export type InputOf<E> = E extends Endpoint<infer I, unknown> ? I : never;
export type OutputOf<E> =
  E extends Endpoint<never, infer O> ? O : E extends Endpoint<infer _I, infer O> ? O : never;

/** A call not yet made: the same value keys the cache in the browser and the service on the server. */
export interface Call<Input, Output> {
  readonly endpoint: Endpoint<Input, Output>;
  readonly input: Input;
}

export function call<I, O>(to: Endpoint<I, O>, input: I): Call<I, O> {
  return { endpoint: to, input };
}

/** Cache key of a call: its name, then its input. */
export function callKey(c: Call<unknown, unknown>): readonly unknown[] {
  return [c.endpoint.name, c.input];
}

/**
 * Fills a path's places from the input and says what is left over.
 * @throws RangeError when a place has no value.
 */
export function fillPath(
  path: string,
  input: Readonly<Record<string, unknown>>,
): { path: string; rest: Record<string, unknown> } {
  const rest: Record<string, unknown> = { ...input };
  const filled = path.replace(/:([a-zA-Z]+)/g, (_match, name: string) => {
    const value = rest[name];
    if (value === undefined || value === null) throw new RangeError(`${path}: no value for ${name}`);
    delete rest[name];
    return encodeURIComponent(String(value));
  });
  return { path: filled, rest };
}
