import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { putIssuesInOwnWords } from '../shared/issue-words';
import { App } from './app';
import './index.css';

putIssuesInOwnWords();

// A newer build has replaced the part that was asked for: the page starts again with it.
window.addEventListener('vite:preloadError', () => window.location.reload());

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with the id "root".');
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
