import { AreaPage } from '#renderer/area.tsx';
import { adminArea } from './area.tsx';

export function Page() {
  return <AreaPage area={adminArea} />;
}
