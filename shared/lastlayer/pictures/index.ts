// What only a few pages need stands beside: cube-view.ts, shade-warnings.ts.
export * from './colours.ts';
export * from './describe.ts';
export * from './flat-view.ts';
export { sitesApart } from './marks.ts';
export * from './mask.ts';
export * from './palettes.ts';
export * from './seat-view.ts';
export * from './stickers.ts';
