import './app/theme/fonts.css';
import '@mantine/core/styles.layer.css';
import './app/theme/tokens.css';
import './app/theme/density.css';
import './app/theme/base.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from './app/app';
import { applyTheme } from './app/theme/apply-theme';

applyTheme();

createRoot(document.getElementById('root')!).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
