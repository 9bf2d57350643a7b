import './app.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { Providers } from './providers.tsx';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root.');
createRoot(root).render(
  <StrictMode>
    <Providers />
  </StrictMode>,
);
