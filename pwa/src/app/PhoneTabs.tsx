import { IonLabel, IonTabBar, IonTabButton } from '@ionic/react';
import { SECTIONS } from '../platform/paths';

/**
 * The five tabs, in words. Called as a function and not as a component: the Ionic tabs look for the tab bar among
 * their direct children.
 */
export function PhoneTabs() {
  return (
    <IonTabBar slot="bottom" className="phone-tabs">
      {SECTIONS.map((section) => (
        <IonTabButton key={section.name} tab={section.name} href={section.path}>
          <IonLabel>{section.label}</IonLabel>
        </IonTabButton>
      ))}
    </IonTabBar>
  );
}
