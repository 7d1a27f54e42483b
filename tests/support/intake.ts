import type { DraftView, PublishInput, SettleLineInput } from '#shared/contracts/intake.ts';
import type { TestApi } from './api.ts';
import type { Person } from './factories.ts';

/**
 * PLL algorithms that people know by heart, from memory; that each solves the case it stands beside is proved
 * for the same texts by the tests of the seed files.
 */
export const KNOWN = {
  T: "R U R' U' R' F R2 U' R' U' R U R' F'",
  F: "R' U' F' R U R' U' R' F R2 U' R' U' R U R' U R",
  H: 'M2 U M2 U2 M2 U M2',
  Y: "F R U' R' U' R U R' F' R U R' U' R' F R F'",
} as const;

type Administrator = Pick<Person, 'claims'>;

/** The steps of an intake as an administrator's browser takes them. */
export function intakeSteps(api: TestApi) {
  const upload = (who: Administrator, csv: string | Uint8Array, change: object = {}) =>
    api.as(who.claims).post('/api/admin/intake', {
      setKey: 'pll',
      fileName: 'spring.csv',
      content: Buffer.from(csv).toString('base64'),
      ...change,
    });
  const read = async (who: Administrator, draftId: string): Promise<DraftView> => {
    const res = await api.as(who.claims).get(`/api/admin/intake/${draftId}`);
    if (res.status !== 200) throw new Error(`${res.status} ${JSON.stringify(res.body)}`);
    return res.body as DraftView;
  };
  return {
    upload,
    read,
    /** Uploads lines under the usual header and reads the draft. */
    async draftOf(who: Administrator, ...lines: string[]): Promise<DraftView> {
      const res = await upload(who, ['case,algorithm', ...lines, ''].join('\n'));
      if (res.status !== 200) throw new Error(`${res.status} ${JSON.stringify(res.body)}`);
      return read(who, (res.body as { draftId: string }).draftId);
    },
    settle: (
      who: Administrator,
      { draft, version }: DraftView,
      { line, ...step }: Omit<SettleLineInput, 'draftId' | 'version'> & { version?: number },
    ) => api.as(who.claims).patch(`/api/admin/intake/${draft.draftId}/lines/${line}`, { version, ...step }),
    publish: (who: Administrator, { draft, version }: DraftView, change: Partial<PublishInput> = {}) =>
      api.as(who.claims).post(`/api/admin/intake/${draft.draftId}/publish`, { version, note: '', ...change }),
    discard: (who: Administrator, { draft, version }: DraftView) =>
      api.as(who.claims).post(`/api/admin/intake/${draft.draftId}/discard`, { version }),
  };
}
