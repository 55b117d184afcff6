import type { FigureScope } from '@/analytics/figures/figure';
import type { Piece } from '@/analytics/figures/pieces';
import { FigureLink } from './figure-link';

/** A sentence whose figures open. */
export const FigureSentence = ({ pieces, scope }: { pieces: readonly Piece[]; scope: FigureScope }) =>
  pieces.map((piece) =>
    typeof piece === 'string' ? (
      piece
    ) : (
      <FigureLink key={piece.measure} measure={piece.measure} scope={scope}>
        {piece.figure}
      </FigureLink>
    ),
  );
