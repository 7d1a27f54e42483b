import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import {
  Button,
  ChoiceGroup,
  ErrorSummary,
  FileField,
  LinkButton,
  LinkProvider,
  SelectField,
  TextAreaField,
  TextField,
} from '#renderer/ui/index.ts';

const markup = renderToStaticMarkup;

describe('fields', () => {
  it('tie label, hint and error to the input', () => {
    const html = markup(
      <TextField id="name" name="name" label="Name" hint="As on the card" error="Enter a name." />,
    );
    expect(html).toContain('<label for="name"');
    expect(html).toContain('aria-describedby="name-hint name-error"');
    expect(html).toContain('aria-invalid="true"');
    expect(html).toMatch(/id="name-hint"[^>]*>As on the card/);
    expect(html).toMatch(/id="name-error"[^>]*>Enter a name\./);
  });

  it('say nothing of errors or hints they do not have', () => {
    for (const field of [
      <TextField key="a" id="a" label="A" />,
      <TextAreaField key="b" id="b" label="B" />,
      <SelectField key="c" id="c" label="C" options={[{ value: 'pll', label: 'PLL' }]} />,
      <FileField key="d" id="d" label="D" />,
    ]) {
      expect(markup(field)).not.toMatch(/aria-invalid|aria-describedby/);
    }
  });

  it('give the first choice the id that error summaries link to', () => {
    const html = markup(
      <ChoiceGroup
        id="entry"
        name="entry"
        legend="Solved on arrival"
        kind="one"
        value={['eo']}
        error="Choose one."
        choices={[
          { value: 'any', label: 'first two layers only' },
          { value: 'eo', label: 'edges oriented' },
        ]}
      />,
    );
    expect(html).toMatch(/<input type="radio" id="entry"[^>]* name="entry" value="any"/);
    expect(html).toMatch(/id="entry-eo"[^>]*checked=""[^>]* value="eo"/);
    expect(html).toContain('aria-describedby="entry-error"');
  });
});

describe('the error summary', () => {
  it('links each message to its field and takes the focus', () => {
    const html = markup(
      <ErrorSummary title="There is a problem" errors={[{ fieldId: 'name', message: 'Enter a name.' }]} />,
    );
    expect(html).toMatch(/<div tabindex="-1" role="alert"/);
    expect(html).toMatch(/<a href="#name"[^>]*>Enter a name\.<\/a>/);
  });

  it('is not there without errors', () => {
    expect(markup(<ErrorSummary title="There is a problem" errors={[]} />)).toBe('');
  });
});

describe('keys', () => {
  it('are buttons that send nothing unless told to', () => {
    expect(markup(<Button>Go on</Button>)).toContain('type="button"');
    expect(markup(<Button type="submit">Go on</Button>)).toContain('type="submit"');
  });

  it('stay in reach when blocked or busy, and send nothing then', () => {
    for (const key of [
      <Button key="a" type="submit" blocked>
        Publish: 4 lines to settle
      </Button>,
      <Button key="b" type="submit" busy>
        Go on
      </Button>,
      <Button key="c" type="submit" disabled>
        Go on
      </Button>,
    ]) {
      const html = markup(key);
      expect(html).toContain('aria-disabled="true"');
      expect(html).toContain('type="button"');
      expect(html).not.toContain(' disabled');
    }
  });

  it('that lead somewhere are links, rendered the way the area renders links', () => {
    expect(markup(<LinkButton href="/desk">Open</LinkButton>)).toMatch(/^<a href="\/desk"/);
    const html = markup(
      <LinkProvider link={({ href, children }) => <a href={`/base${href}`}>{children}</a>}>
        <LinkButton href="/desk">Open</LinkButton>
      </LinkProvider>,
    );
    expect(html).toContain('href="/base/desk"');
  });
});
