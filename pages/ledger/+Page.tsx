import { AreaPage } from '#renderer/area.tsx';
import { ledgerArea } from './area.tsx';

export function Page() {
  return <AreaPage area={ledgerArea} />;
}
