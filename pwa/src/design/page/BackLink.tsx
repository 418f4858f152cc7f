import type { MouseEvent } from 'react';
import { useIonRouter } from '@ionic/react';

/** Goes back in the history, or to `to` where the page was opened by its address. */
export function BackLink({ to, label }: { readonly to: string; readonly label: string }) {
  const router = useIonRouter();
  const goBack = (event: MouseEvent): void => {
    if (event.metaKey || event.ctrlKey || event.shiftKey) return;
    event.preventDefault();
    if (router.canGoBack()) router.goBack();
    else router.push(to, 'back', 'pop');
  };
  return (
    <a className="hm-back" href={to} onClick={goBack} aria-label={`Back to ${label}`}>
      <svg width="22" height="22" viewBox="0 0 22 22" aria-hidden="true">
        <path
          d="M13.5 4 6.5 11l7 7"
          fill="none"
          stroke="currentColor"
          strokeWidth="2.5"
          strokeLinecap="round"
        />
      </svg>
    </a>
  );
}
