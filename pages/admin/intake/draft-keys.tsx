import { useState } from 'react';
import { downloadCsv } from '#renderer/csv.ts';
import { Button } from '#renderer/ui/index.ts';
import type { DraftView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { DiscardDialog, PublishDialog } from './draft-dialogs.tsx';
import { reportCsv } from './report-csv.ts';
import type { DraftSteps } from './use-draft-steps.ts';

const text = intakeText.draft;

/** What can be done with the draft as a whole: report, discard, publish. */
export function DraftKeys({ view, steps }: { view: DraftView; steps: DraftSteps }) {
  const [asking, setAsking] = useState<'publish' | 'discard' | null>(null);
  const { draft, lines, cannot, toDecide } = view;
  const open = draft.state === 'open';
  const left = cannot + toDecide;
  const nothing = lines.every(({ standing }) => standing === 'out');
  return (
    <div className="screen-only flex flex-wrap items-center gap-3">
      {open && (
        <Button kind="plain" onClick={() => setAsking('discard')}>
          {text.discard}
        </Button>
      )}
      <Button kind="outlined" onClick={() => downloadCsv(text.reportFile(draft.fileName), reportCsv(lines))}>
        {text.report}
      </Button>
      {open && (
        <Button blocked={left > 0 || nothing} onClick={() => setAsking('publish')}>
          {left > 0 ? text.publishBlocked(left) : nothing ? text.publishNothing : text.publish}
        </Button>
      )}
      <PublishDialog
        view={view}
        open={asking === 'publish'}
        busy={steps.publishing}
        onCancel={() => setAsking(null)}
        onPublish={(note) => steps.publish(note, () => setAsking(null))}
      />
      <DiscardDialog
        view={view}
        open={asking === 'discard'}
        busy={steps.discarding}
        onCancel={() => setAsking(null)}
        onDiscard={() => steps.discard(() => setAsking(null))}
      />
    </div>
  );
}
