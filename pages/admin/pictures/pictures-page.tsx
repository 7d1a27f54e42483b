import { PageTitle } from '#renderer/ui/index.ts';
import { pictureSettingsText as text } from '#shared/text/picture-settings.ts';
import { PicturesForm } from '../../pictures/pictures-form.tsx';

/** How pictures are drawn for an administrator; members and captains find the same under Club. */
export function PicturesPage() {
  return (
    <>
      <PageTitle title={text.title} lead={text.lead} />
      <PicturesForm />
    </>
  );
}
