import { describe, expect, it } from 'vitest';
import type { PictureSettings } from '#shared/contracts/pictures.ts';
import { useApi } from '#tests/support/api.ts';

const api = useApi();

const SHADES = {
  white: '#FFFFFF',
  yellow: '#FFDD00',
  green: '#008844',
  blue: '#0044CC',
  orange: '#FF8800',
  red: '#CC0022',
};
const USUAL: PictureSettings = { palette: 'standard', letters: false, ownShades: null };

async function picturesOf(claims: Parameters<typeof api.as>[0]): Promise<PictureSettings> {
  const res = await api.as(claims).get('/api/session');
  expect(res.status).toBe(200);
  return (res.body as { pictures: PictureSettings }).pictures;
}

describe('how pictures are drawn for a person', () => {
  it('is as usual until they say otherwise', async () => {
    const person = await api.factory.person();
    expect(await picturesOf(person.claims)).toEqual(USUAL);
  });

  it('is kept with the account of members, captains and administrators alike', async () => {
    const people = [
      await api.factory.person(),
      await api.factory.person({ role: 'captain' }),
      await api.factory.administrator(),
    ];
    for (const { claims } of people) {
      const wanted: PictureSettings = { palette: 'safe', letters: true, ownShades: null };
      const res = await api.as(claims).put('/api/pictures', wanted);
      expect(res.status).toBe(200);
      expect(res.body).toEqual(wanted);
      expect(await picturesOf(claims)).toEqual(wanted);
    }
  });

  it('keeps shades of one’s own while another palette is chosen', async () => {
    const { claims } = await api.factory.person();
    await api.as(claims).put('/api/pictures', { palette: 'own', letters: false, ownShades: SHADES });
    const res = await api
      .as(claims)
      .put('/api/pictures', { palette: 'greys', letters: false, ownShades: null });
    expect(res.body).toEqual({ palette: 'greys', letters: false, ownShades: SHADES });
  });

  it('comes with the session from signing in on', async () => {
    const person = await api.factory.person();
    await api.as(person.claims).put('/api/pictures', { ...USUAL, palette: 'stickerless' });
    const res = await api
      .as(null)
      .post('/api/session', { signIn: person.signIn, password: 'four words make sense' });
    expect(res.body).toMatchObject({ session: { pictures: { palette: 'stickerless' } } });
  });

  it('refuses what is no palette and no shade, naming the field', async () => {
    const { claims } = await api.factory.person();
    const refused = async (body: object, pointer: string) => {
      const res = await api.as(claims).put('/api/pictures', body);
      expect(res.status).toBe(400);
      expect(res.body.errors).toEqual([expect.objectContaining({ pointer })]);
    };
    await refused({ ...USUAL, palette: 'neon' }, '/palette');
    await refused({ ...USUAL, palette: 'own' }, '/ownShades');
    await refused({ ...USUAL, ownShades: { ...SHADES, red: 'red"/><script>' } }, '/ownShades/red');
    expect(await picturesOf(claims)).toEqual(USUAL);
  });

  it('asks for a sign-in, and touches nobody else’s', async () => {
    const [one, other] = [await api.factory.person(), await api.factory.person()];
    expect((await api.as(null).put('/api/pictures', USUAL)).status).toBe(401);
    const named = { ...USUAL, palette: 'safe', accountId: other.accountId };
    expect((await api.as(one.claims).put('/api/pictures', named)).status).toBe(400);
    await api.as(one.claims).put('/api/pictures', { ...USUAL, palette: 'safe' });
    expect(await picturesOf(other.claims)).toEqual(USUAL);
  });
});
