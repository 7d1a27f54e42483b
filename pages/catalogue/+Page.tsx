import { AreaPage } from '#renderer/area.tsx';
import { catalogueArea } from './area.tsx';

export function Page() {
  return <AreaPage area={catalogueArea} />;
}
