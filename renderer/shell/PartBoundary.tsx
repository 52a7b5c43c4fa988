import { Component, type ErrorInfo, type ReactNode } from 'react';

interface PartBoundaryProps {
  /** "the card", "the view". */
  readonly part: string;
  readonly children: ReactNode;
}

interface PartBoundaryState {
  readonly failure: string | null;
}

/** Keeps a failure in one part of the window from taking the others, and the project, with it. */
export class PartBoundary extends Component<PartBoundaryProps, PartBoundaryState> {
  override state: PartBoundaryState = { failure: null };

  static getDerivedStateFromError(error: unknown): PartBoundaryState {
    return { failure: error instanceof Error ? error.message : String(error) };
  }

  override componentDidCatch(error: unknown, info: ErrorInfo): void {
    console.error(`Drawing ${this.props.part} failed.`, error, info.componentStack);
  }

  override render(): ReactNode {
    const { failure } = this.state;
    if (failure === null) return this.props.children;
    return (
      <div className="part-failed" role="alert">
        <p>
          <b>Could not draw {this.props.part}.</b> The project is safe; save it, or undo the last change and
          try again.
        </p>
        <p className="second">{failure}</p>
        <button type="button" className="button" onClick={() => this.setState({ failure: null })}>
          Try again
        </button>
      </div>
    );
  }
}
