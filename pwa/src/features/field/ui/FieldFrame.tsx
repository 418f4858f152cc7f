import { createContext, use, useState, type ComponentProps, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { PageFrame } from '../../../design/page/PageFrame';
import './field.css';

type Places = { readonly foot: HTMLElement | null; readonly subtitle: HTMLElement | null };

const PlacesContext = createContext<Places>({ foot: null, subtitle: null });

/**
 * The frame of a page of Field. It stays one and the same while what it shows is read, starts and ends: an outlet
 * that keeps pages alive takes a page whose frame was exchanged for one that was just opened. What stands inside
 * fills the foot by `InFoot` and the line under the title by `InSubtitle`.
 */
export function FieldFrame(props: Omit<ComponentProps<typeof PageFrame>, 'foot' | 'subtitle'>) {
  const [foot, setFoot] = useState<HTMLElement | null>(null);
  const [subtitle, setSubtitle] = useState<HTMLElement | null>(null);
  return (
    <PageFrame
      {...props}
      subtitle={<div ref={setSubtitle} />}
      foot={<div ref={setFoot} className="fd-foot-place" />}
    >
      <PlacesContext value={{ foot, subtitle }}>{props.children}</PlacesContext>
    </PageFrame>
  );
}

/** Stays below the scrolling content, in reach of the thumb. */
export function InFoot({ children }: { readonly children: ReactNode }) {
  const { foot } = use(PlacesContext);
  return foot ? createPortal(children, foot) : null;
}

/** The facts under the title. */
export function InSubtitle({ children }: { readonly children: ReactNode }) {
  const { subtitle } = use(PlacesContext);
  return subtitle ? createPortal(children, subtitle) : null;
}
