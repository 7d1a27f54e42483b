import { useEffect, useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router';
import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { Button, ChoiceGroup, PageTitle } from '#renderer/ui/index.ts';
import type { DrawnView } from '#shared/contracts/catalogue-search.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { type Cell, EMPTY_DRAWING, painted, writeDrawing } from '#shared/lastlayer/drawing.ts';
import type { Side, Site } from '#shared/lastlayer/pictures/index.ts';
import { drawingText } from '#shared/text/drawing.ts';
import { addressOf, drawnInput, readAddress } from './draw-input.ts';
import { DrawnAnswer } from './drawn-answer.tsx';
import { DrawnResults } from './drawn-results.tsx';
import { PaintChoice } from './paint-choice.tsx';
import { PaintGrid } from './paint-grid.tsx';

const text = drawingText;
/** A moment's rest in painting: browsers limit how often an address may change. */
const REST_MS = 150;

/** Paint a last layer, and see which cases look like it. The drawing is in the address. */
export function DrawPage() {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const address = readAddress(search);
  const [drawing, draw] = useState(address.drawing);
  const [paint, choose] = useState<Cell>('yellow');
  const catalogue = useCall(endpoints.catalogue, {});
  const query = useCall(endpoints.catalogueDrawn, drawnInput(address), { keepWhileLoading: true });

  const [drawn, inAddress] = [writeDrawing(drawing), writeDrawing(address.drawing)];
  const to = addressOf({ drawing, sets: address.sets });
  useEffect(() => {
    if (drawn === inAddress) return;
    const timer = setTimeout(() => void navigate(to, { replace: true, preventScrollReset: true }), REST_MS);
    return () => clearTimeout(timer);
  }, [drawn, inAddress, to, navigate]);

  const onPaint = ([side, index]: Site, cell: Cell = paint) => {
    // The centre names the top colour: it is some colour, or left at the usual one.
    if (side === 'top' && index === 4 && cell === 'other') return;
    draw(painted(drawing, side, index, cell));
  };
  const look = (key: string, wanted: boolean) => {
    const others = address.sets.filter((one) => one !== key);
    const sets = wanted ? [...others, key] : others;
    void navigate(addressOf({ drawing, sets }), { replace: true, preventScrollReset: true });
  };
  return (
    <>
      <PageTitle title={text.title} lead={text.lead} />
      <div className="grid items-start gap-x-14 gap-y-8 lg:grid-cols-[21rem_minmax(0,1fr)] lg:grid-rows-[auto_1fr]">
        <div className="screen-only flex flex-col gap-3 sm:gap-5">
          <PaintChoice value={paint} onChange={choose} />
          <DrawnAnswer view={query.data} />
          <PaintGrid drawing={drawing} wrong={wrongSites(query.data)} onPaint={onPaint} />
          <p className="text-sm text-ink-2 max-sm:hidden">
            {text.keys} {text.paintHint}
          </p>
          <div>
            <Button kind="outlined" onClick={() => draw(EMPTY_DRAWING)}>
              {text.clear}
            </Button>
          </div>
        </div>
        <Awaited query={query}>
          {({ problems, sets }) => (
            <div className="lg:col-start-2 lg:row-span-2 lg:row-start-1">
              {problems.length === 0 && <DrawnResults sets={sets} />}
            </div>
          )}
        </Awaited>
        {catalogue.data && (
          <ChoiceGroup
            id="draw-sets"
            name="sets"
            legend={text.sets}
            kind="many"
            paired
            value={address.sets}
            choices={catalogue.data.sets.map(({ setKey, name }) => ({ value: setKey, label: name }))}
            onChange={({ target }) => look(target.value, target.checked)}
          />
        )}
      </div>
    </>
  );
}

function wrongSites(view: DrawnView | undefined): readonly Site[] {
  return (view?.problems ?? []).flatMap(({ sites }) =>
    sites.map(({ side, index }): Site => [side as Side, index]),
  );
}
