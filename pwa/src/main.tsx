import '@ionic/react/css/core.css';
import '@ionic/react/css/normalize.css';
import '@ionic/react/css/structure.css';
import './design/fonts.css';
import './design/tokens.css';
import './design/base.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { App } from './app/App';
import { preloadNext, preloadPage } from './app/pages';
import { whenIdle } from './platform/idle';
import { registerWorker } from './app/updates/worker';
import { followTheme } from './design/theme/theme';
import { keepInstallOffer } from './platform/install-offer';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no #root');
preloadPage(location.pathname);
followTheme();
keepInstallOffer();
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
// not in the way of the first screen
whenIdle(() => {
  registerWorker().catch((error: unknown) =>
    console.error('The application is not kept on this device', error),
  );
}, 3000);
setTimeout(() => whenIdle(preloadNext), 6000);
