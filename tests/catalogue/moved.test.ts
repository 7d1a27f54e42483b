import { expect, it } from 'vitest';
import { movedTo } from '#pages/admin/moved.ts';

it('leads from the earlier addresses of the catalogue to those of today', () => {
  expect(movedTo('/admin/catalogue')).toBe('/catalogue');
  expect(movedTo('/admin/catalogue/')).toBe('/catalogue');
  expect(movedTo('/admin/catalogue/oll/1')).toBe('/catalogue/oll/editions/1');
  expect(movedTo('/admin/catalogue/what/ever/else')).toBe('/catalogue');
  expect(movedTo('/admin/intake')).toBeNull();
  expect(movedTo('/admin/cataloguer')).toBeNull();
});
