import { Component, type ErrorInfo, type ReactNode } from 'react';
import { BrokenPage } from './BrokenPage';

type PageBoundaryProps = { readonly children: ReactNode };
type PageBoundaryState = { readonly error: Error | null };

/** Keeps a fault of one screen to that screen: the tabs, the logbook and what is being sent stay as they are. */
export class PageBoundary extends Component<PageBoundaryProps, PageBoundaryState> {
  override state: PageBoundaryState = { error: null };

  static getDerivedStateFromError(error: unknown): PageBoundaryState {
    return { error: error instanceof Error ? error : new Error(String(error)) };
  }

  override componentDidCatch(error: unknown, info: ErrorInfo): void {
    console.error('A screen stopped', error, info.componentStack);
  }

  override render(): ReactNode {
    if (this.state.error) return <BrokenPage error={this.state.error} />;
    return this.props.children;
  }
}
