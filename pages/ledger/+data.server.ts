import type { PageContextServer } from 'vike/types';
import { loadArea } from '#renderer/load-area.ts';
import { ledgerArea } from './area.tsx';

// https://vike.dev/data
export const data = (pageContext: PageContextServer) => loadArea(ledgerArea, pageContext);
