// First of all imports: the content security policy forbids what zod would otherwise try at its first parse.
import './app/configure-zod.ts';
import './styles/index.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from './app/app.tsx';
import { adoptNonce } from './app/adopt-nonce.ts';
import { watchTheme } from './lib/theme/theme.ts';

adoptNonce();
watchTheme();

const root = document.getElementById('root');
if (root === null) throw new Error('The page has no #root.');
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
