import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths';
import { fitStrings } from '../../strings/fits';
import { MarginBlock } from '../../ui/page/margin-block';

const words = fitStrings.margin;

export const KeysBlock = () => (
  <MarginBlock title={words.keys}>
    <p>{words.keysNote}</p>
    <p>{words.figureKeys}</p>
  </MarginBlock>
);

/** Into the pair at hand. */
export const BringInBlock = ({ pairId }: { readonly pairId: string }) => (
  <MarginBlock>
    <p>
      <Link to={paths.newSeries(pairId)}>{words.bringIn}</Link>
    </p>
  </MarginBlock>
);
