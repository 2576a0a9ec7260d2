import './theme/tokens.css';
import './theme/fonts.css';
import './theme/base.css';
import './theme/semi-tokens.css';
import './theme/semi-controls.css';
import './theme/semi-overlays.css';
import './theme/semi-data.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { AppProvider } from './app/provider';
import { createRouter } from './app/router';
import { createQueryClient } from './lib/query-client';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id "root".');

createRoot(root).render(
  <StrictMode>
    <AppProvider client={createQueryClient()}>
      <RouterProvider router={createRouter()} />
    </AppProvider>
  </StrictMode>,
);
