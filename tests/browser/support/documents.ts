import type { APIResponse, Response } from 'playwright-core';
import { expect } from 'vitest';

/** The nonce of a document's policy. @throws where its headers let in more than our own scripts and styles. */
export async function nonceOf(response: Response | APIResponse): Promise<string> {
  const headers = response.headers();
  expect(headers).toMatchObject({
    'cache-control': 'no-store',
    'content-type': expect.stringMatching(/^text\/html; ?charset=utf-8$/i),
    'cross-origin-opener-policy': 'same-origin',
    'referrer-policy': 'same-origin',
    'x-content-type-options': 'nosniff',
  });
  expect(headers).not.toHaveProperty('x-powered-by');
  const policy = new Map(
    (headers['content-security-policy'] ?? '').split(';').map((directive) => {
      const [name = '', ...values] = directive.trim().split(/\s+/);
      return [name, values.join(' ')];
    }),
  );
  expect(policy.get('default-src')).toBe("'none'");
  expect(policy.get('frame-ancestors')).toBe("'none'");
  expect(policy.get('base-uri')).toBe("'none'");
  const [, nonce = ''] = /^'nonce-([\w-]{22})' 'strict-dynamic'$/.exec(policy.get('script-src') ?? '') ?? [];
  expect(policy.get('style-src')).toBe(`'self' 'nonce-${nonce}'`);
  // No attribute of the document needs what the policy forbids.
  expect(await response.text()).not.toMatch(/<[^>]+\sstyle="|<[^>]+\son\w+="/);
  return nonce;
}
