import { renderToString } from 'react-dom/server';
import { dangerouslySkipEscape, escapeInject } from 'vike/server';
import type { PageContextServer } from 'vike/types';
import { shellText } from '#shared/text/shell.ts';
import { Shell } from './shell.tsx';

// https://vike.dev/onRenderHtml
export function onRenderHtml(pageContext: PageContextServer) {
  const body = renderToString(<Shell pageContext={pageContext} />);
  const data = pageContext.data as { title?: string } | undefined;
  const title = pageContext.title ?? data?.title;
  return escapeInject`<!DOCTYPE html>
<html lang="en-GB">
  <head>
    <meta charset="utf-8">
    <meta name="viewport" content="width=device-width, initial-scale=1, viewport-fit=cover">
    <meta name="color-scheme" content="light dark">
    <title>${title ? `${title} · ${shellText.product}` : shellText.product}</title>
    <meta name="description" content="${shellText.description}">
    <link rel="icon" href="/icon.svg" type="image/svg+xml">
    <link rel="apple-touch-icon" href="/apple-touch-icon.png">
  </head>
  <body>
    <div id="root">${dangerouslySkipEscape(body)}</div>
  </body>
</html>`;
}
