import { IonApp, IonRouterOutlet, IonTabs, setupIonicReact } from '@ionic/react';
import { IonReactRouter } from '@ionic/react-router';
import { Providers } from './Providers';
import { ROUTES } from './routes';
import { SideRail } from './SideRail';
import { PhoneTabs } from './PhoneTabs';
import { RedFilter } from './RedFilter';
import { UpdateLine } from './updates/UpdateLine';
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
          <div className="shell">
            <SideRail />
            <div className="shell-main">
              <IonTabs>
                <IonRouterOutlet animated={false}>{ROUTES}</IonRouterOutlet>
                {PhoneTabs()}
              </IonTabs>
              <UpdateLine />
            </div>
          </div>
        </IonReactRouter>
      </IonApp>
    </Providers>
  );
}
