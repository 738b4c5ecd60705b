import '@fontsource-variable/bricolage-grotesque/wght.css';
import '@fontsource-variable/instrument-sans/wght.css';
import './styles/theme.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { installMessages } from '#shared/contracts/messages.ts';
import { App } from '#web/app/app.tsx';

// So that the page and the API refuse the same mistake in the same words.
installMessages();

const root = document.getElementById('root');
if (!root) throw new Error('The page has no #root to draw in.');
createRoot(root, {
  // The boundary that catches an error decides what is a fault worth reporting.
  onCaughtError: () => undefined,
}).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
