import { AreaPage } from '#renderer/area.tsx';
import { deskArea } from './area.tsx';

export function Page() {
  return <AreaPage area={deskArea} />;
}
