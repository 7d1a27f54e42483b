/** Run by process-zones.test.ts in a process of its own, whose time zone it changes: prints what the model says. */
import { DEFAULT_COSTS, dayStart, foldCase, localDay, planQueue } from '#shared/memory/index.ts';
import { row } from './rows.ts';

const log = [
  row(19_800, 0, { outcome: 'missed' }),
  row(19_800, 1),
  row(19_801, 0),
  row(19_804, 0, { keysOffered: 8 }),
  row(19_812, 0, { outcome: 'late' }),
  row(19_833, 0),
];
const instants = [Date.UTC(2024, 2, 31, 0, 30), Date.UTC(2024, 9, 27, 1, 30), Date.UTC(2011, 11, 30, 10)];
const zones = ['Europe/London', 'Australia/Lord_Howe', 'Pacific/Apia'];
function probe(processZone: string) {
  process.env.TZ = processZone;
  const { memory, firsts } = foldCase(log);
  return {
    offset: new Date(Date.UTC(2024, 0, 1)).getTimezoneOffset(),
    model: {
      memory,
      firsts,
      queue: planQueue({
        cards: [{ key: 'a', prior: 1, memory }],
        day: 19_900,
        beta: 0.07,
        seconds: 60,
        newCap: 1,
        costs: DEFAULT_COSTS,
      }),
      days: zones.map((zone) => instants.map((instant) => localDay(instant, zone, 4))),
      starts: zones.map((zone) => dayStart(15_338, zone, 4)),
    },
  };
}

process.stdout.write(JSON.stringify(process.argv.slice(2).map(probe)));
