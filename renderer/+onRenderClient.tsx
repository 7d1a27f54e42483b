import { hydrateRoot } from 'react-dom/client';
import type { PageContextClient } from 'vike/types';
import { Shell } from './shell.tsx';

// https://vike.dev/onRenderClient
export function onRenderClient(pageContext: PageContextClient) {
  const root = document.getElementById('root');
  if (!root) throw new Error('The document has no #root.');
  hydrateRoot(root, <Shell pageContext={pageContext} />);
}
