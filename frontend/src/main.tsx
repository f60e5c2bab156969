import '@fontsource/ibm-plex-sans/latin-400.css';
import '@fontsource/ibm-plex-sans/latin-ext-400.css';
import '@fontsource/ibm-plex-sans/latin-600.css';
import '@fontsource/ibm-plex-sans/latin-ext-600.css';
import '@fontsource/ibm-plex-mono/latin-400.css';
import '@fontsource/ibm-plex-mono/latin-ext-400.css';
import '@fontsource/ibm-plex-mono/latin-600.css';
import '@fontsource/ibm-plex-mono/latin-ext-600.css';
import './app/fonts/fonts.css';
import './app/theme/tokens.css';
import './app/base.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter } from 'react-router-dom';
import { makeQueryClient } from './api/queries';
import { App } from './app/app';
import { routes } from './app/routes';

const root = document.getElementById('root');
if (!root) throw new Error('The page has no element #root');
const queryClient = makeQueryClient();

createRoot(root).render(
  <StrictMode>
    <App queryClient={queryClient} router={createBrowserRouter(routes)} />
  </StrictMode>,
);
