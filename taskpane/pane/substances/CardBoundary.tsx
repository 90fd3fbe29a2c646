import { Component, type ReactNode } from 'react';
import { Notice } from '../look/Notice';

interface BoundaryState {
  readonly defect: string | undefined;
}

/** Keeps a defect of one card from taking the whole pane away, and says that it is one. */
export class CardBoundary extends Component<{ readonly name: string; readonly children: ReactNode }, BoundaryState> {
  override state: BoundaryState = { defect: undefined };

  static getDerivedStateFromError(error: unknown): BoundaryState {
    return { defect: error instanceof Error ? error.message : String(error) };
  }

  override render(): ReactNode {
    const { defect } = this.state;
    if (defect === undefined) return this.props.children;
    return (
      <Notice tone="error">
        The card of {this.props.name} can’t be shown because of a defect in Latentry itself: {defect}. The rest of the
        pane, and formulas, go on working.
      </Notice>
    );
  }
}
