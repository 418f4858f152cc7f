import { useEffect, useRef, type MouseEvent } from 'react';
import { useLocation } from 'react-router-dom';
import { useIonRouter } from '@ionic/react';
import { SECTIONS, sectionOf, type SectionName } from '../platform/paths';

/**
 * The five tabs, in words. A tab leads back to where its section was left; a tap on the tab that is open leads to
 * the section's first page. Plain links in a landmark: they are ways to places, not panels of one page.
 */
export function PhoneTabs() {
  const { pathname, search } = useLocation();
  const router = useIonRouter();
  const here = sectionOf(pathname);
  const left = useRef(new Map<SectionName, string>());
  useEffect(() => {
    if (here) left.current.set(here, pathname + search);
  }, [here, pathname, search]);
  const go = (event: MouseEvent, name: SectionName, root: string): void => {
    if (event.metaKey || event.ctrlKey || event.shiftKey) return;
    event.preventDefault();
    const goal = name === here ? root : (left.current.get(name) ?? root);
    if (goal !== pathname + search) router.push(goal, 'none', 'push');
  };
  return (
    <nav className="phone-tabs" aria-label="Sections">
      {SECTIONS.map(({ name, path, label }) => (
        <a
          key={name}
          href={path}
          aria-current={name === here ? 'page' : undefined}
          onClick={(event) => go(event, name, path)}
        >
          {label}
        </a>
      ))}
    </nav>
  );
}
