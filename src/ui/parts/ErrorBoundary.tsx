import { Component } from 'react';
import type { ReactNode } from 'react';

interface Caught {
  readonly failed: boolean;
}

/** Keeps the rest of the page when one view cannot be drawn or fetched. Nothing typed is touched by it. */
export class ErrorBoundary extends Component<{ readonly children: ReactNode }, Caught> {
  override state: Caught = { failed: false };

  static getDerivedStateFromError(): Caught {
    return { failed: true };
  }

  override render(): ReactNode {
    if (!this.state.failed) return this.props.children;
    return (
      <p className="problem" role="alert">
        This view could not be shown. The recipe is kept.{' '}
        <button type="button" className="plain" onClick={() => { window.location.reload(); }}>Load the page again</button>
      </p>
    );
  }
}
