import { useParams } from 'react-router-dom';
import { ReviewPage } from '../features/review/review-page';
import { SheetSection } from '../features/sheets/sheet-page';

/** /versions/:id/review */
export function Component() {
  const { id = '' } = useParams();
  return (
    <ReviewPage
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
