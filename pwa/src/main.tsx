import '@ionic/react/css/core.css';
import '@ionic/react/css/normalize.css';
import '@ionic/react/css/structure.css';
import './design/fonts.css';
import './design/tokens.css';
import './design/base.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from './app/App';
import { followTheme } from './design/theme/theme';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');
followTheme();
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
