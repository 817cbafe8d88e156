import type { CSSVariablesResolver, MantineColorsTuple } from '@mantine/core';
import { createTheme } from '@mantine/core';
import { variantColours } from './variant-colours';

/** Ten steps of the one working colour; 7 is the light theme's, 3 the dark theme's. */
const petrol: MantineColorsTuple = [
  '#ddeef0',
  '#b9dde2',
  '#8fd3dd',
  '#62cbd9',
  '#3aa9b8',
  '#1f8896',
  '#126f7d',
  '#0a5a66',
  '#084a54',
  '#00404a',
];

const FONT =
  "'Inter', system-ui, -apple-system, 'Segoe UI', Roboto, 'Helvetica Neue', Arial, sans-serif";

const control = { '--input-height': 'var(--control)' };

export const theme = createTheme({
  primaryColor: 'petrol',
  colors: { petrol },
  primaryShade: { light: 7, dark: 3 },
  autoContrast: true,
  variantColorResolver: variantColours,
  defaultRadius: 6,
  focusRing: 'auto',
  cursorType: 'pointer',
  respectReducedMotion: true,
  fontFamily: FONT,
  fontFamilyMonospace: FONT,
  fontSizes: {
    xs: 'var(--text-label)',
    sm: 'var(--text-table)',
    md: 'var(--text-body)',
    lg: 'var(--text-section)',
    xl: 'var(--text-title)',
  },
  lineHeights: {
    xs: 'var(--lead-label)',
    sm: 'var(--lead-table)',
    md: 'var(--lead-body)',
    lg: 'var(--lead-section)',
    xl: 'var(--lead-title)',
  },
  spacing: { xs: '0.25rem', sm: '0.5rem', md: '0.75rem', lg: '1rem', xl: '1.5rem' },
  shadows: { xs: 'none', sm: 'none', md: 'none', lg: 'none', xl: 'none' },
  headings: {
    fontWeight: '600',
    sizes: {
      h1: { fontSize: 'var(--text-title)', lineHeight: 'var(--lead-title)' },
      h2: { fontSize: 'var(--text-section)', lineHeight: 'var(--lead-section)' },
      h3: { fontSize: 'var(--text-section)', lineHeight: 'var(--lead-section)' },
    },
  },
  components: {
    Button: {
      defaultProps: { variant: 'outline' },
      vars: () => ({
        root: { '--button-height': 'var(--control)', '--button-fz': 'var(--text-table)' },
      }),
    },
    ActionIcon: {
      defaultProps: { variant: 'subtle' },
      vars: () => ({ root: { '--ai-size': 'var(--control-icon)' } }),
    },
    Input: { vars: () => ({ wrapper: { ...control, '--input-fz': 'var(--text-body)' } }) },
    Modal: {
      defaultProps: { centered: true, transitionProps: { duration: 120, transition: 'fade' } },
    },
    Menu: { defaultProps: { transitionProps: { duration: 120, transition: 'fade' } } },
    Popover: { defaultProps: { transitionProps: { duration: 120, transition: 'fade' } } },
    Tooltip: { defaultProps: { openDelay: 400 } },
  },
});

/** Mantine's own variables, taken from the tokens, so that a component never brings a colour of its own. */
const FROM_TOKENS = {
  '--mantine-color-body': 'var(--paper)',
  '--mantine-color-text': 'var(--ink)',
  '--mantine-color-bright': 'var(--ink)',
  '--mantine-color-dimmed': 'var(--ink2)',
  '--mantine-color-placeholder': 'var(--ink2)',
  '--mantine-color-anchor': 'var(--petrol)',
  '--mantine-color-error': 'var(--over-text)',
  '--mantine-color-default': 'var(--surface)',
  '--mantine-color-default-hover': 'var(--sunken)',
  '--mantine-color-default-color': 'var(--ink)',
  '--mantine-color-default-border': 'var(--edge)',
  '--mantine-color-disabled': 'var(--sunken)',
  '--mantine-color-disabled-color': 'var(--ink2)',
  '--mantine-color-disabled-border': 'var(--edge)',
  '--mantine-primary-color-contrast': 'var(--on-petrol)',
  '--mantine-color-petrol-text': 'var(--petrol)',
  '--mantine-color-petrol-filled': 'var(--petrol)',
  '--mantine-color-petrol-filled-hover': 'var(--petrol-hover)',
  '--mantine-color-petrol-light': 'var(--petrol-tint)',
  '--mantine-color-petrol-light-hover': 'var(--petrol-tint)',
  '--mantine-color-petrol-light-color': 'var(--ink)',
  '--mantine-color-petrol-outline': 'var(--petrol)',
  '--mantine-color-petrol-outline-hover': 'var(--petrol-tint)',
};

export const cssVariables: CSSVariablesResolver = () => ({
  variables: {},
  light: FROM_TOKENS,
  dark: FROM_TOKENS,
});
