import { useParams } from 'react-router-dom';
import { CurrentSheetPage, SheetVersionPage } from '../features/sheets/sheet-page';

/** /sheets/:code and /sheets/:code/:number */
export function Component() {
  const { code = '', number } = useParams();
  // A new address is a new page: nothing typed for one version stands on another.
  return number === undefined ? (
    <CurrentSheetPage key={code} code={code} />
  ) : (
    <SheetVersionPage key={`${code} ${number}`} code={code} number={number} />
  );
}
