import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import {
  AlgorithmText,
  BottomNav,
  type Column,
  ConfirmDialog,
  DataTable,
  Definitions,
  ErrorState,
  FlatView,
  KeyGrid,
  LoadingState,
  Mark,
  Notice,
  SeatView,
  TopBar,
  Verdict,
} from '#renderer/ui/index.ts';
import { typedAhead } from '#renderer/ui/key-grid.tsx';
import { stickersOf } from '#shared/lastlayer/pictures/index.ts';

const markup = renderToStaticMarkup;
const nothing = () => undefined;

describe('a table', () => {
  const columns: Column<{ name: string; share: number }>[] = [
    { key: 'name', header: 'Member', cell: (row) => row.name, rowHeader: true },
    {
      key: 'share',
      header: 'All',
      cell: (row) => row.share,
      align: 'end',
      sort: { direction: 'descending', href: '?sort=share' },
    },
  ];

  it('is native, named by its caption, and says how it is sorted', () => {
    const html = markup(
      <DataTable
        caption="Squad"
        columns={columns}
        rows={[{ name: 'Ines', share: 95 }]}
        rowKey={(row) => row.name}
      />,
    );
    expect(html).toMatch(/<caption id="([^"]+)"[^>]*>Squad<\/caption>/);
    expect(html).toMatch(/<th scope="col" aria-sort="descending"[^>]*><a href="\?sort=share"/);
    expect(html).toMatch(/<th scope="row"[^>]*>Ines<\/th>/);
  });

  it('scrolls inside a region that the keyboard reaches', () => {
    const html = markup(<DataTable caption="Squad" columns={columns} rows={[]} rowKey={(row) => row.name} />);
    const id = /<caption id="([^"]+)"/.exec(html)?.[1];
    expect(html).toContain(`<section aria-labelledby="${id}" tabindex="0"`);
  });

  it('says so when it is empty', () => {
    const html = markup(
      <DataTable
        caption="Squad"
        columns={columns}
        rows={[]}
        rowKey={(row) => row.name}
        empty="No members yet."
      />,
    );
    expect(html).toMatch(/<td colSpan="2"[^>]*>No members yet\.<\/td>/);
  });
});

describe('the grid of keys', () => {
  const keys = ['Aa', 'Ab', 'E', 'Ga', 'Gb'].map((value) => ({ value, label: value }));

  it('is one tab stop, and says which key is chosen', () => {
    const html = markup(<KeyGrid legend="Case" keys={keys} columns={4} value="E" onPick={nothing} />);
    expect(html.match(/tabindex="0"/g)).toHaveLength(1);
    expect(html.match(/aria-pressed="true"/g)).toHaveLength(1);
    expect(html).toMatch(/aria-pressed="true"[^>]*>E</);
  });

  it('goes to the next key that begins with a typed letter, round the end', () => {
    expect(typedAhead(keys, 0, 'a')).toBe(1);
    expect(typedAhead(keys, 1, 'A')).toBe(0);
    expect(typedAhead(keys, 4, 'g')).toBe(3);
    expect(typedAhead(keys, 0, 'z')).toBeNull();
  });
});

describe('the bars', () => {
  const items = [
    { href: '/today', label: 'Today', current: true },
    { href: '/cases', label: 'My cases' },
  ];

  it('mark the current place for everyone', () => {
    for (const html of [
      markup(<BottomNav label="Places" items={items} />),
      markup(
        <TopBar
          product="P"
          homeHref="/"
          navigationLabel="Places"
          skipLabel="Skip to content"
          items={items}
        />,
      ),
    ]) {
      expect(html).toContain('<nav aria-label="Places"');
      expect(html.match(/aria-current="page"/g)).toHaveLength(1);
    }
  });

  it('let keyboards skip the places', () => {
    const html = markup(
      <TopBar product="P" homeHref="/" navigationLabel="Places" skipLabel="Skip to content" items={items} />,
    );
    expect(html.indexOf('href="#content"')).toBeGreaterThan(0);
    expect(html.indexOf('href="#content"')).toBeLessThan(html.indexOf('href="/today"'));
  });
});

describe('the mark', () => {
  it('inks one orbit of the quarter turn', () => {
    const cells = [...markup(<Mark />).matchAll(/<rect x="(\d+)" y="(\d+)"[^>]*class="fill-ink/g)].map(
      ([, x, y]) => [(Number(x) - 1) / 12, (Number(y) - 1) / 12],
    );
    expect(cells).toHaveLength(4);
    for (const [x, y] of cells) expect(cells).toContainEqual([3 - y!, x]);
  });
});

describe('pictures in a page', () => {
  const stickers = stickersOf(31_337);

  it('are described by their stickers in a showing, hidden beside a name in a table', () => {
    const seat = markup(<SeatView stickers={stickers} colouring={3} holding="right" />);
    expect(seat).toMatch(/role="img" aria-label="Front left corner: top [WYGBOR]/);
    expect(markup(<FlatView stickers={stickers} />)).toContain('aria-hidden="true"');
    expect(markup(<FlatView stickers={stickers} alt={{ text: 'Case T' }} />)).toContain(
      'aria-label="Case T"',
    );
  });
});

describe('words and states', () => {
  it('prints primes and marks what is not a move', () => {
    expect(markup(<AlgorithmText text="R U'' R'" wrong={{ column: 3, length: 3 }} />)).toMatch(
      /R <mark[^>]*>U′′<\/mark> R′/,
    );
  });

  it('strikes a wrong name through', () => {
    const html = markup(<Verdict tone="rose" word="named" name="Ra" struck picture={null} />);
    expect(html).toMatch(/named.*<s[^>]*>Ra<\/s>/);
  });

  it('announces what appears', () => {
    expect(markup(<Notice live title="Saved" />)).toContain('role="status"');
    expect(markup(<Notice live tone="rose" title="Not saved" />)).toContain('role="alert"');
    expect(markup(<Notice title="To know" />)).not.toContain('role=');
    expect(markup(<LoadingState label="Loading" />)).toMatch(/role="status" class="[^"]*appear-late/);
    expect(markup(<ErrorState title="It did not load" retryLabel="Try again" onRetry={nothing} />)).toMatch(
      /role="alert".*<button/,
    );
  });

  it('uses no style attributes anywhere', () => {
    const all = markup(
      <>
        <SeatView stickers={stickersOf(5)} colouring={0} holding="left" letters />
        <Definitions rows={[{ term: 'lost by', value: 'mirror' }]} />
        <ConfirmDialog
          open={false}
          title="Erase?"
          confirmLabel="Erase"
          cancelLabel="Keep"
          onConfirm={nothing}
          onCancel={nothing}
        />
        <Mark title="P" />
      </>,
    );
    expect(all).not.toContain(' style=');
    expect(all).toContain('<dialog');
  });
});
