import { useParams } from 'react-router-dom';
import { SheetSection } from '../features/sheets/sheet-page';
import { EditVersionPage } from '../features/versions/edit-version-page';

/** /versions/:id/edit */
export function Component() {
  const { id = '' } = useParams();
  return (
    <EditVersionPage
      key={id}
      id={id}
      renderSection={(section, version) => (
        <SheetSection
          section={section}
          version={version}
          code={version.sheet.code}
          pairId={version.sheet.pair.id}
          file={`${version.sheet.code}-${version.number}`}
        />
      )}
    />
  );
}
