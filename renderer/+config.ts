import type { Config } from 'vike/types';

// https://vike.dev/config. Links between areas are document loads; inside an area React Router moves.
export default {
  clientRouting: false,
  hydrationCanBeAborted: true,
  passToClient: ['title', 'problem'],
  meta: {
    title: { env: { server: true, client: true } },
  },
} satisfies Config;
