import { AreaPage } from '#renderer/area.tsx';
import { memberArea } from './area.tsx';

export function Page() {
  return <AreaPage area={memberArea} />;
}
