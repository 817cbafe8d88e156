import type { VariantColorsResolver } from '@mantine/core';

const PETROL = 'var(--petrol)';
const TINT = 'var(--petrol-tint)';

/** What a button of each kind looks like, in tokens: right in all three themes without asking which one is on. */
export const variantColours: VariantColorsResolver = ({ variant }) => {
  switch (variant) {
    case 'filled':
      return {
        background: PETROL,
        hover: 'var(--petrol-hover)',
        color: 'var(--on-petrol)',
        border: `var(--stroke-strong) solid ${PETROL}`,
      };
    case 'light':
      return {
        background: TINT,
        hover: TINT,
        color: 'var(--ink)',
        border: '1px solid transparent',
      };
    case 'default':
      return {
        background: 'var(--surface)',
        hover: 'var(--sunken)',
        color: 'var(--ink)',
        border: 'var(--stroke) solid var(--edge)',
      };
    case 'subtle':
    case 'transparent':
      return {
        background: 'transparent',
        hover: TINT,
        color: PETROL,
        border: '1px solid transparent',
      };
    default:
      return {
        background: 'var(--surface)',
        hover: TINT,
        color: PETROL,
        border: `var(--stroke-strong) solid ${PETROL}`,
      };
  }
};
