import type { WireColour } from '@fairlead/shared';
import { useWords } from '../../../../hooks/use-words';
import classes from './conductors.module.css';

/** Insulation colours: reserved for conductors, never used for anything else. */
const INSULATION: Record<WireColour, string> = {
  BK: '#1b1b1b',
  RD: '#c4161c',
  BL: '#1457b8',
  WH: '#ffffff',
  GN: '#1a7f37',
  BN: '#7a4a21',
  OR: '#f28c18',
  YL: '#f5d90a',
  GY: '#8f9498',
};

/** A striped capsule with its letters and an ink outline, so that it reads without colour. */
export function ColourChip({ colour }: { colour: WireColour }) {
  const { say } = useWords();
  return (
    <span
      className={classes.chip}
      role="img"
      aria-label={say(`workbench.conductors.colours.${colour}`)}
    >
      <span className={classes.chipStripe} style={{ background: INSULATION[colour] }} />
      <span aria-hidden>{colour}</span>
    </span>
  );
}
