import { Key } from '../ui/Key.tsx';
import { InsideView } from './InsideView.tsx';
import { UnrolledGlobe } from './UnrolledGlobe.tsx';
import { useDesk, useDeskTools } from './use-desk.ts';

/** The pictures of the eye over the record: its wall laid flat, or its inside. */
export const Pictures = () => {
  const { store } = useDeskTools();
  const picture = useDesk((state) => state.picture);
  const other = picture === 'wall' ? 'inside' : 'wall';
  return (
    <div className="pictures">
      {picture === 'wall' ? <UnrolledGlobe /> : <InsideView />}
      <button type="button" className="picture-turn" data-picture-turn onClick={() => store.turnPicture()}>
        {other === 'inside' ? 'fundus and bubble' : 'wall laid flat'} <Key>D</Key>
      </button>
    </div>
  );
};
