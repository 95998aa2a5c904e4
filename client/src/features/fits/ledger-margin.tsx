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

export const BringInBlock = () => (
  <MarginBlock>
    <p>
      <Link to={paths.newSeries()}>{words.bringIn}</Link>
    </p>
  </MarginBlock>
);
