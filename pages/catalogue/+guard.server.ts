import type { PageContextServer } from 'vike/types';
import { guardArea } from '#renderer/load-area.ts';

// https://vike.dev/guard
export const guard = (pageContext: PageContextServer) =>
  guardArea(pageContext, ['member', 'captain', 'administrator']);
