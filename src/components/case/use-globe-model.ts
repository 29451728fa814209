import { useMemo } from 'react';
import { globeFrom } from './globe-from-record.ts';
import { useDesk } from './use-desk.ts';

/** What the pictures of the eye show, made anew only when a part of the record changes that they are made from. */
export const useGlobeModel = () => {
  const who = useDesk((state) => state.record.who?.eye);
  const before = useDesk((state) => state.record.before);
  const breaks = useDesk((state) => state.record.breaks);
  const buckle = useDesk((state) => state.record.buckle);
  return useMemo(
    () =>
      globeFrom({
        version: 1,
        ...(who && { who: { eye: who } }),
        ...(before && { before }),
        ...(breaks && { breaks }),
        ...(buckle && { buckle }),
      }),
    [who, before, breaks, buckle],
  );
};
