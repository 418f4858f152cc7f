import { IonApp, IonRouterOutlet, setupIonicReact } from '@ionic/react';
import { IonReactRouter } from '@ionic/react-router';
import { Providers } from './Providers';
import { ROUTES } from './routes';
import { Shell } from './Shell';
import { RedFilter } from './RedFilter';
import './shell.css';

setupIonicReact({
  mode: 'md',
  animated: !window.matchMedia('(prefers-reduced-motion: reduce)').matches,
  rippleEffect: false,
  focusManagerPriority: ['heading', 'content'],
});

/** The whole application: providers, the rail of a laptop, the tabs of a phone, and one page in the outlet. */
export function App() {
  return (
    <Providers>
      <IonApp>
        <RedFilter />
        <IonReactRouter>
          <Shell>
            <IonRouterOutlet animated={false}>{ROUTES}</IonRouterOutlet>
          </Shell>
        </IonReactRouter>
      </IonApp>
    </Providers>
  );
}
