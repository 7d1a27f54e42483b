import './styles.css';
import type { PageContext } from 'vike/types';
import { PageContextProvider } from './page-context-provider.tsx';

/** The React tree of a document, the same on both sides. */
export function Shell({ pageContext }: { pageContext: PageContext }) {
  const { Page } = pageContext;
  return (
    <PageContextProvider value={pageContext}>
      <Page />
    </PageContextProvider>
  );
}
