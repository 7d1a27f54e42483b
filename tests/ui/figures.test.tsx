import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { FigureBar, RulerTicks, TrendLine } from '#renderer/ui/index.ts';
import { plotLine, plotY } from '#renderer/ui/trend-path.ts';

const markup = renderToStaticMarkup;

describe('a figure', () => {
  it('prints the number, a tick at it and a bar over its interval', () => {
    const html = markup(
      <FigureBar figure={{ value: 0.8, low: 0.7, high: 0.95 }} text="80" label="80 %, 70 to 95" />,
    );
    expect(html).toContain('>80</span>');
    expect(html).toMatch(/<rect x="70.00%" width="25.00%"/);
    expect(html).toMatch(/<line x1="80.00%" x2="80.00%"/);
    expect(html).toContain('>80 %, 70 to 95</span>');
  });

  it('stays on its axis and never vanishes', () => {
    const html = markup(<FigureBar figure={{ value: 1, low: 0.999, high: 1.2 }} text="100" label="100 %" />);
    expect(html).toMatch(/<rect x="98.00%" width="2.00%"/);
    expect(html).toMatch(/x1="100.00%"/);
  });

  it('is hollow where it rests on few answers, and an axis alone where there are none', () => {
    const figure = { value: 0.5, low: 0.4, high: 0.6 };
    expect(markup(<FigureBar figure={figure} text="50" label="50 %" hollow />)).toMatch(
      /<rect[^>]*stroke-ink/,
    );
    expect(markup(<FigureBar figure={figure} text="50" label="50 %" />)).toMatch(/<rect[^>]*fill-bar/);
    expect(markup(<FigureBar figure={null} text="–" label="no answers" />)).not.toContain('<rect');
  });
});

describe('the ruler of a sitting', () => {
  const ticks = (done: number, total: number) => {
    const html = markup(
      <RulerTicks done={done} total={total} label="Sitting" text={`${done} of ${total}`} />,
    );
    return {
      html,
      all: html.match(/<line/g)?.length ?? 0,
      dark: html.match(/stroke-ink/g)?.length ?? 0,
      long: html.match(/x2="100%"/g)?.length ?? 0,
    };
  };

  it('has a tick for each showing, dark when done, every fifth long', () => {
    expect(ticks(14, 32)).toMatchObject({ all: 32, dark: 14, long: 6 });
    expect(ticks(0, 3)).toMatchObject({ all: 3, dark: 0, long: 0 });
  });

  it('lets a tick stand for several in a long sitting', () => {
    expect(ticks(100, 200)).toMatchObject({ all: 50, dark: 25 }); // derived: 4 showings a tick
  });

  it('says where it stands', () => {
    expect(ticks(14, 32).html).toMatch(/role="progressbar"[^>]*aria-valuenow="14" aria-valuetext="14 of 32"/);
  });

  it('has an axis even before anything is planned', () => {
    expect(ticks(0, 0)).toMatchObject({ all: 1, dark: 0 });
  });
});

describe('a line over time', () => {
  const x = { min: 0, max: 10 };
  const y = { min: 0, max: 1 };

  it('has its highest value at the top', () => {
    expect([plotY(1, y, 100), plotY(0, y, 100), plotY(0.25, y, 100)]).toEqual([0, 100, 75]);
  });

  it('breaks where nothing is known, and keeps lone points visible', () => {
    const points = [
      { x: 0, y: 0 },
      { x: 5, y: 1 },
      { x: 6, y: null },
      { x: 10, y: 0.5 },
    ];
    expect(plotLine(points, x, y, 100, 100)).toBe('M0 100L50 0M100 50h4');
  });

  it('does not divide by an empty extent', () => {
    expect(plotLine([{ x: 3, y: 2 }], { min: 3, max: 3 }, { min: 2, max: 2 }, 100, 100)).toBe('M0 100h4');
  });

  it('has a table of the same figures behind it', () => {
    const html = markup(
      <TrendLine
        label="Recall, PLL"
        series={[{ key: 'pll', label: 'PLL', points: [{ x: 0, y: 0.5 }] }]}
        x={{ ...x, ticks: [] }}
        y={{ ...y, ticks: [] }}
        table={{ head: ['day', 'PLL'], rows: [['1 May', '50 %']] }}
      />,
    );
    expect(html).toMatch(/<caption>Recall, PLL<\/caption>.*<td>50 %<\/td>/);
  });
});
