import type { Piece } from '../model/list-rows';
import { BendFields } from './bend-fields';
import { FittingFields } from './fitting-fields';
import { FlexFields } from './flex-fields';
import { OffsetFields } from './offset-fields';
import { PullPointFields } from './pull-point-fields';
import { SaddleFields } from './saddle-fields';
import { TransitionFields } from './transition-fields';

export interface PieceProps<T extends Piece> {
  piece: T;
  sectionId: string | null;
}

/** The fields of a piece, by its kind. */
export function PieceFields({ piece, sectionId }: PieceProps<Piece>) {
  switch (piece.kind) {
    case 'pull-point':
      return <PullPointFields piece={piece} sectionId={sectionId} />;
    case 'bend':
      return <BendFields piece={piece} sectionId={sectionId} />;
    case 'offset':
      return <OffsetFields piece={piece} sectionId={sectionId} />;
    case 'saddle-3':
    case 'saddle-4':
      return <SaddleFields piece={piece} sectionId={sectionId} />;
    case 'flex':
      return <FlexFields piece={piece} sectionId={sectionId} />;
    case 'fitting':
      return <FittingFields piece={piece} />;
    case 'transition':
      return <TransitionFields piece={piece} />;
  }
}
