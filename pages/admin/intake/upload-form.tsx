import { type FormEvent, useState } from 'react';
import { useNavigate } from 'react-router';
import { useSend, useStore } from '#renderer/api.ts';
import {
  Button,
  ErrorSummary,
  type FieldError,
  FileField,
  Notice,
  ProgressBar,
  SelectField,
} from '#renderer/ui/index.ts';
import { endpoints } from '#shared/contracts/endpoints.ts';
import type { IntakeView } from '#shared/contracts/intake.ts';
import { intakeText } from '#shared/text/intake.ts';
import { LARGEST_FILE, readAsBase64 } from './read-file.ts';

const text = intakeText.list;
const SET = 'intake-set';
const FILE = 'intake-file';

/** Chooses a set and a file, reads the file here and sends it; its draft opens when it has been read there. */
export function UploadForm({ sets }: { sets: IntakeView['sets'] }) {
  const navigate = useNavigate();
  const store = useStore();
  const [setKey, setSetKey] = useState('');
  const [file, setFile] = useState<File | null>(null);
  const [errors, setErrors] = useState<readonly FieldError[]>([]);
  const [bytesRead, setBytesRead] = useState<number | null>(null);
  const upload = useSend(endpoints.upload, {
    onDone: ({ draftId }) => {
      void store.refresh(endpoints.intake);
      void navigate(`/admin/intake/${draftId}`);
    },
  });
  const errorAt = (fieldId: string) => errors.find((error) => error.fieldId === fieldId)?.message;

  async function submit(event: FormEvent) {
    event.preventDefault();
    const wrong = checked(setKey, file);
    setErrors(wrong);
    if (wrong.length > 0 || !file) return;
    setBytesRead(0);
    const content = await readAsBase64(file, setBytesRead).catch(() => null);
    setBytesRead(null);
    if (content === null) return setErrors([{ fieldId: FILE, message: text.unreadable }]);
    upload.mutate(
      { setKey, fileName: file.name, content },
      {
        onError: (error) => {
          if (error.status === 422 || error.status === 400 || error.status === 413)
            setErrors([{ fieldId: FILE, message: error.message }]);
        },
      },
    );
  }

  const busy = bytesRead !== null || upload.isPending;
  const failed = upload.isError && errors.length === 0;
  return (
    <form onSubmit={submit} noValidate aria-busy={busy} className="space-y-5">
      <ErrorSummary title={text.formErrors} errors={errors} />
      {failed && (
        <Notice tone="rose" title={text.formErrors} live>
          <p>{upload.error.message}</p>
        </Notice>
      )}
      <div className="grid items-end gap-5 lg:grid-cols-[20rem_minmax(0,1fr)_auto]">
        <SelectField
          id={SET}
          label={text.set}
          error={errorAt(SET)}
          value={setKey}
          onChange={(event) => setSetKey(event.target.value)}
          options={[
            { value: '', label: text.chooseSet },
            ...sets.map(({ setKey: value, name, cases, newestEdition }) => ({
              value,
              label: text.setOption(name, cases, newestEdition),
            })),
          ]}
        />
        <FileField
          id={FILE}
          label={text.file}
          error={errorAt(FILE)}
          hint={text.fileHint}
          accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
          onChange={(event) => {
            setFile(event.target.files?.[0] ?? null);
            setErrors([]);
          }}
        />
        <Button type="submit" busy={busy}>
          {text.send}
        </Button>
      </div>
      {busy && (
        <div className="appear-late">
          {bytesRead !== null && file ? (
            <ProgressBar label={text.reading} value={bytesRead} max={file.size} />
          ) : (
            <ProgressBar label={text.sending} value={null} max={1} />
          )}
        </div>
      )}
    </form>
  );
}

function checked(setKey: string, file: File | null): FieldError[] {
  const errors: FieldError[] = [];
  if (setKey === '') errors.push({ fieldId: SET, message: text.noSetChosen });
  if (!file) errors.push({ fieldId: FILE, message: text.noFile });
  else if (file.size > LARGEST_FILE) errors.push({ fieldId: FILE, message: text.tooLarge });
  return errors;
}
