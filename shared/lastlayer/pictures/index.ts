export * from './colours.ts';
export * from './describe.ts';
export * from './flat-view.ts';
export * from './mask.ts';
export * from './palettes.ts';
export * from './seat-view.ts';
export * from './shade-warnings.ts';
export * from './stickers.ts';
