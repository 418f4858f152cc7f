import { useCallback, useEffect, type ReactNode } from 'react';
import { IonContent, IonPage, useIonViewDidEnter } from '@ionic/react';
import { BackLink } from './BackLink';
import { TopBar } from './TopBar';
import './page.css';

type PageFrameProps = {
  /** The page's one h1, and the name of the browser tab. */
  readonly title: string;
  /** Where *back* leads when there is no way back in the history. Absent on the first page of a tab. */
  readonly back?: { readonly to: string; readonly label: string };
  /** Keeps the h1 for screen readers only, where the drawing has none (Field, Coverage). */
  readonly hideTitle?: boolean;
  /** One line under the title: what, where, when. */
  readonly subtitle?: ReactNode;
  /** Small actions at the right of the title. */
  readonly actions?: ReactNode;
  /** Stays below the scrolling content, in reach of the thumb. */
  readonly foot?: ReactNode;
  /** False where the page fills the height itself (map, score pad, virtual list). */
  readonly scrolls?: boolean;
  /** True where tables or a map need the whole width of a laptop. */
  readonly wide?: boolean;
  /** True to leave out the bar with lamp and badge (score pad). */
  readonly hideTopBar?: boolean;
  readonly children: ReactNode;
};

/** The frame of each screen: top bar or back link, title, content and a foot. It names the browser tab when shown. */
export function PageFrame(props: PageFrameProps) {
  const { title, back, scrolls = true, wide = false } = props;
  const nameTab = useCallback(() => {
    document.title = `${title} · Harkmoor`;
  }, [title]);
  useIonViewDidEnter(nameTab, [nameTab]);
  useEffect(nameTab, [nameTab]);
  const column = wide ? 'hm-column hm-column-wide' : 'hm-column';
  return (
    <IonPage>
      <header className="hm-page-head">
        {back ? null : props.hideTopBar ? null : <TopBar />}
        <div className={props.hideTitle ? 'only-heard' : `${column} hm-title-row`}>
          {back ? <BackLink to={back.to} label={back.label} /> : null}
          <div className="hm-title-words">
            <h1 tabIndex={-1}>{title}</h1>
            {props.subtitle ? <div className="hm-subtitle">{props.subtitle}</div> : null}
          </div>
          {props.actions ? <div className="hm-title-actions">{props.actions}</div> : null}
        </div>
      </header>
      <IonContent scrollY={scrolls}>
        <div className={scrolls ? column : 'hm-fill'}>{props.children}</div>
      </IonContent>
      {props.foot ? (
        <section className="hm-page-foot" aria-label="Keys">
          {props.foot}
        </section>
      ) : null}
    </IonPage>
  );
}
