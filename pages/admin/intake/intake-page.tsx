import { useCall } from '#renderer/api.ts';
import { Awaited } from '#renderer/awaited.tsx';
import { EmptyState, PageTitle, Section } from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import { intakeText } from '#shared/text/intake.ts';
import { DraftTable } from './draft-table.tsx';
import { UploadForm } from './upload-form.tsx';

const text = intakeText.list;

/** Files: one to bring in, those whose lines wait to be settled, and those of before. */
export function IntakePage() {
  const query = useCall(endpoints.intake, {});
  return (
    <>
      <PageTitle title={text.title} lead={text.lead} />
      <Awaited query={query} loading={text.loading} failed={text.cannotLoad}>
        {({ sets, drafts }) => {
          const open = drafts.filter(({ state }) => state === 'open');
          const closed = drafts.filter(({ state }) => state !== 'open');
          return (
            <div className="space-y-10">
              <Section title={text.form} ruled>
                <div className="pt-4">
                  <UploadForm sets={sets} />
                </div>
              </Section>
              <Section title={text.drafts}>
                {open.length > 0 ? (
                  <DraftTable caption={text.draftsCaption} drafts={open} closed={false} />
                ) : (
                  <EmptyState title={text.noDrafts}>
                    <p>{text.noDraftsHint}</p>
                  </EmptyState>
                )}
              </Section>
              {closed.length > 0 && (
                <Section title={text.earlier}>
                  <DraftTable caption={text.earlierCaption} drafts={closed} closed />
                </Section>
              )}
            </div>
          );
        }}
      </Awaited>
    </>
  );
}
