import { expect, it } from 'vitest';
import type { AssignSetInput, SquadView } from '#shared/contracts/desk.ts';
import type { MyCasesView } from '#shared/contracts/member.ts';
import { caseSet } from '#shared/lastlayer/index.ts';
import { recall } from '#shared/memory/index.ts';
import { useApi } from '../support/api.ts';
import { derivedOf, rebuild } from '../support/derived.ts';
import type { Person } from '../support/factories.ts';
import { insertMemory, insertRollup, londonDay } from '../support/figures.ts';
import { Phone } from '../support/training.ts';

const api = useApi();
const DAY = 86_400_000;
const pll = caseSet('pll');
const EDGES = ['Ua', 'Ub', 'H', 'Z'];
const keyOf = (name: string) => pll.byName(name)?.key ?? '';

/** A club with a subset of PLL of its own: the four cases that move edges only. */
async function clubWithSubset() {
  const club = await api.factory.club();
  const captain = await api.factory.person({ club, role: 'captain' });
  const member = await api.factory.person({ club, minutesPerDay: 10 });
  const res = await api.as(captain.claims).post('/api/case-sets', {
    kind: 'subset',
    name: 'Edges only',
    parentKey: 'pll',
    caseKeys: EDGES.map(keyOf),
  });
  expect(res.status).toBe(200);
  return { club, captain, member, edges: (res.body as { setKey: string }).setKey };
}

async function assign(captain: Person, setKey: string, change: Partial<AssignSetInput> = {}) {
  return api.as(captain.claims).put(`/api/desk/programme/${setKey}`, {
    pinnedEdition: null,
    limitMs: 3000,
    asksAuf: true,
    forEveryone: true,
    memberIds: [],
    version: 0,
    ...change,
  });
}

const withdraw = (captain: Person, setKey: string) =>
  api.as(captain.claims).delete(`/api/desk/programme/${setKey}`, { version: 1 });

it('a subset is trained like any set: its own names, its parent’s algorithms and editions', async () => {
  const { captain, member, edges } = await clubWithSubset();
  expect((await assign(captain, edges)).status).toBe(200);
  const today = await new Phone(api, member).today();
  expect(today.sets).toMatchObject([{ setKey: edges, name: 'Edges only', edition: 1 }]);
  expect(today.sets[0]?.grids.all?.map(({ label }) => label)).toEqual(['H', 'Ua', 'Ub', 'Z', 'solved']);
  const { verdicts } = await new Phone(api, member).answerNext();
  expect(verdicts[0]).toMatchObject({ outcome: 'held', was: { setName: 'Edges only' } });
  // The prior is the chance in the parent's step: a U perm is one PLL in 18, H and Z one in 72 and 36 (common practice).
  const { cases } = (await api.as(member.claims).get('/api/cases')).body as MyCasesView;
  expect(cases.map(({ name, prior }) => [name, prior.total / prior.weight]).sort()).toEqual([
    ['H', 72],
    ['Ua', 18],
    ['Ub', 18],
    ['Z', 36],
  ]);
});

it('the captain’s pages tell of a subset as of any set', async () => {
  const { captain, member, edges } = await clubWithSubset();
  await assign(captain, edges);
  await new Phone(api, member).answerNext({ named: 'lost', aufBefore: null });
  const squad = await api.as(captain.claims).get(`/api/desk/squad?setKey=${edges}`);
  expect(squad.status).toBe(200);
  expect(squad.body.sets).toMatchObject([{ setKey: edges, name: 'Edges only' }]);
  expect(squad.body.lost.length).toBe(4);
  const page = await api.as(captain.claims).get(`/api/desk/members/${member.memberId}`);
  expect(page.body.lately).toMatchObject([{ setName: 'Edges only', outcome: 'missed' }]);
});

it('moving from a subset to the whole and back keeps what was learned, and rebuilding differs by nothing', async () => {
  const { captain, member, edges } = await clubWithSubset();
  const phone = new Phone(api, member);
  const train = async (answers: number) => {
    for (let n = 0; n < answers; n++) {
      const showing = (await phone.today()).showings[0];
      if (!showing) return;
      const change = n % 3 === 2 ? { named: 'lost', aufBefore: null } : {};
      expect((await phone.send(await phone.answerTo(showing.id, change))).status).toBe(200);
    }
  };
  await assign(captain, edges);
  for (let day = 0; day < 3; day++) {
    await train(5);
    api.clock.advance(DAY);
  }
  await train(2);
  const learned = await api.factory.sql<{ case_key: string; answers: number }>(
    'select case_key, answers from case_state where member_id = $1 order by case_key',
    [member.memberId],
  );
  expect(learned.length).toBe(4);

  // In the middle of a training day, so that both sets have answers of it.
  expect((await withdraw(captain, edges)).status).toBe(200);
  expect((await assign(captain, 'pll')).status).toBe(200);
  const { cases } = (await api.as(member.claims).get('/api/cases')).body as MyCasesView;
  for (const { case_key: key, answers } of learned) {
    expect(cases.find((one) => one.key === key)).toMatchObject({ setKey: 'pll', answers });
  }
  for (let day = 0; day < 3; day++) {
    await train(6);
    api.clock.advance(DAY);
  }

  // Back, after days on which the subset's cases moved on without it.
  await withdraw(captain, 'pll');
  await assign(captain, edges);
  await train(3);
  api.clock.advance(DAY);
  await train(2);

  const sets = await api.factory.sql<{ set_key: string }>(
    'select distinct set_key from review where member_id = $1',
    [member.memberId],
  );
  expect(sets.map((row) => row.set_key).sort()).toEqual([edges, 'pll'].sort());
  const before = await derivedOf(api, member);
  await rebuild(api, member);
  expect(await derivedOf(api, member)).toEqual(before);
}, 90_000);

it('an answer given through a subset that was withdrawn meanwhile still counts, in both sets’ days', async () => {
  const { captain, member, edges } = await clubWithSubset();
  const phone = new Phone(api, member);
  await assign(captain, edges);
  const [first, kept] = (await phone.today()).showings;
  if (!first || !kept) throw new Error('Two showings are wanted.');
  await phone.send(await phone.answerTo(first.id));
  const late = await phone.answerTo(kept.id, { named: 'lost', aufBefore: null });
  await withdraw(captain, edges);
  await assign(captain, 'pll');
  api.clock.advance(DAY);
  await phone.answerNext();
  api.clock.advance(DAY);
  expect((await phone.send(late)).status).toBe(200);
  const before = await derivedOf(api, member);
  await rebuild(api, member);
  expect(await derivedOf(api, member)).toEqual(before);
}, 60_000);

it('who moves to a set that shares cases has the true figure of it at once, and it says what it rests on', async () => {
  const { captain, member, edges } = await clubWithSubset();
  await assign(captain, 'pll');
  const phone = new Phone(api, member);
  await phone.today();
  // Known from PLL: the log and the memory of the edges' cases, as answers would have left them.
  const day = londonDay(api.clock.now());
  for (const caseName of EDGES) {
    await insertMemory(api.factory, member, { caseName, stability: 100, lastDay: day - 1 });
  }
  await withdraw(captain, 'pll');
  expect((await assign(captain, edges)).status).toBe(200);

  const read = async () => (await api.as(captain.claims).get('/api/desk/squad')).body as SquadView;
  const figureOf = (view: SquadView, { memberId }: Person) =>
    view.rows.find((row) => row.memberId === memberId)?.cells[0]?.figure;
  const view = await read();
  const figure = figureOf(view, member);
  const memory = { stability: 100, lastDay: day - 1 } as Parameters<typeof recall>[0];
  // Nothing was answered first on a day before, so no calibration shifts the curve: recall at the coming rollover.
  expect(figure?.value).toBeCloseTo(recall(memory, day + 1), 9);
  expect(figure).toMatchObject({ answers: 0, rests: 'elsewhere' });
  expect(figureOf(view, captain)).toMatchObject({ value: 0, rests: 'nothing' });
  const page = await api.as(captain.claims).get(`/api/desk/members/${member.memberId}`);
  expect(page.body.sets[0].now).toEqual(figure);
  const form = await api.as(member.claims).get('/api/form');
  expect(form.body.sets[0].now).toMatchObject({ value: figure?.value, rests: 'elsewhere' });

  // Reading wrote nothing, and the first answer here is one it rests on.
  expect(await read()).toEqual(view);
  api.clock.advance(200 * DAY);
  await phone.answerNext();
  expect(figureOf(await read(), member)).toMatchObject({ answers: 1, rests: 'here' });
});

it('answers from before the last 28 days are answers in the set', async () => {
  const club = await api.factory.club();
  const captain = await api.factory.person({ club, role: 'captain' });
  await api.factory.assign(club, 'pll');
  const day = londonDay(api.clock.now());
  await insertRollup(api.factory, captain, { day: day - 40, sumPe: 100, answers: 30 });
  await insertRollup(api.factory, captain, { day, sumPe: 90, answers: 0 });
  for (const query of ['', '?setKey=pll']) {
    const { rows } = (await api.as(captain.claims).get(`/api/desk/squad${query}`)).body as SquadView;
    expect(rows[0]?.cells.at(-1)?.figure).toMatchObject({ answers: 0, rests: 'here' });
  }
});

it('nobody answers for a case through two sets: the refusal names both and who', async () => {
  const { club, captain, member, edges } = await clubWithSubset();
  await assign(captain, edges);
  const everyone = await assign(captain, 'pll');
  expect(everyone.status).toBe(422);
  expect(everyone.body.errors).toEqual([expect.objectContaining({ pointer: '/forEveryone' })]);
  expect(everyone.body.detail).toBe(
    'PLL and Edges only share 4 cases, and everyone answers for them through Edges only already. First edit Edges only to Chosen members without those who are to answer for PLL, or withdraw Edges only if nobody needs it. What was learned stays.',
  );
  const one = await assign(captain, 'pll', { forEveryone: false, memberIds: [member.memberId] });
  expect(one.body.detail).toContain(`and ${member.nickname} answers for them`);
  expect(one.body.detail).toContain(`edit Edges only to Chosen members without ${member.nickname}, or`);
  expect(one.body.errors).toEqual([expect.objectContaining({ pointer: '/memberIds' })]);

  // Handed to different people the two stand side by side; widening either is refused.
  const second = await api.factory.person({ club });
  const narrowed = await assign(captain, edges, {
    forEveryone: false,
    memberIds: [member.memberId],
    version: 1,
  });
  expect(narrowed.status).toBe(200);
  expect((await assign(captain, 'pll', { forEveryone: false, memberIds: [second.memberId] })).status).toBe(
    200,
  );
  const widened = await assign(captain, edges, { version: 2 });
  expect(widened.status).toBe(422);
  expect(widened.body.detail).toContain(`${second.nickname} answers for them through PLL`);
  // Sets of different cases do not meet.
  expect((await assign(captain, 'oll')).status).toBe(200);
});

it('two sets of the same cases assigned at the same moment: one stands', async () => {
  const { captain, edges } = await clubWithSubset();
  const both = await Promise.all([assign(captain, edges), assign(captain, 'pll')]);
  expect(both.map((res) => res.status).sort()).toEqual([200, 422]);
});
