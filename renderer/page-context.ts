import type { ComponentType } from 'react';
import type { Call } from '#shared/contracts/endpoint.ts';
import type { SessionView } from '#shared/contracts/session.ts';

/** What the server hands a page while it is rendered (server/pages.ts). Absent in the browser. */
export interface PageServer {
  readSession(): Promise<SessionView | null>;
  run(
    call: Call<unknown, unknown>,
  ): Promise<{ ok: true; data: unknown } | { ok: false; status: number; detail: string }>;
}

declare global {
  namespace Vike {
    interface PageContext {
      Page: ComponentType;
      server?: PageServer;
      cspNonce?: string;
      /** Title of the document, without the product's name. */
      title?: string;
    }
  }
}
