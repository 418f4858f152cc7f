import { createContext, use, useState, type ComponentProps, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { PageFrame } from '../../../design/page/PageFrame';
import './field.css';

const FootContext = createContext<HTMLElement | null>(null);

/**
 * The frame of a page of Field. It stays one and the same while what it shows is read, starts and ends: an outlet
 * that keeps pages alive takes a page whose frame was exchanged for one that was just opened. What stands inside
 * fills the foot by `InFoot`.
 */
export function FieldFrame(props: Omit<ComponentProps<typeof PageFrame>, 'foot'>) {
  const [foot, setFoot] = useState<HTMLElement | null>(null);
  return (
    <PageFrame {...props} foot={<div ref={setFoot} className="fd-foot-place" />}>
      <FootContext value={foot}>{props.children}</FootContext>
    </PageFrame>
  );
}

/** Stays below the scrolling content, in reach of the thumb. */
export function InFoot({ children }: { readonly children: ReactNode }) {
  const foot = use(FootContext);
  return foot ? createPortal(children, foot) : null;
}
