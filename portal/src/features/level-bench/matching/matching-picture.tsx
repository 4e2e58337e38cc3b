import { memo } from 'react';
import { BandPicture } from './band-picture';
import { FigureTable } from '../results/figure-table';
import { MatchPicture } from './match-picture';
import { NetworkPicture } from './network-picture';
import { ResonancePicture } from './resonance-picture';
import { WindingPicture } from './winding-picture';
import type { MatchingSheet } from './work';

function Picture({ sheet }: { sheet: MatchingSheet }) {
  switch (sheet.kind) {
    case 'match':
      return <MatchPicture sheet={sheet} />;
    case 'l-network':
      return <NetworkPicture sheet={sheet} />;
    case 'winding':
      return <WindingPicture sheet={sheet} />;
    case 'resonance':
      return <ResonancePicture sheet={sheet} />;
    case 'bands':
      return <BandPicture sheet={sheet} />;
  }
}

/** Picture and table of the calculation that is chosen; drawn with a new result, not with every key. */
export const MatchingPicture = memo(function MatchingPicture({ sheet }: { sheet: MatchingSheet }) {
  return (
    <>
      <Picture sheet={sheet} />
      {sheet.kind !== 'l-network' && <FigureTable figures={sheet.figures} />}
    </>
  );
});
