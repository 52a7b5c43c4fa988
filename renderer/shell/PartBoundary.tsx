import { Component, type ErrorInfo, type JSX, type ReactNode } from 'react';
import { shownAssessment, shownProject } from '../store/shown.ts';
import { useWindow } from './services.tsx';

interface PartProps {
  /** "the card", "the view". */
  readonly part: string;
  readonly children: ReactNode;
}

/** Keeps a failure in one part of the window from taking the others, and the project, with it. What it draws from changing, it tries again. */
export function PartBoundary({ part, children }: PartProps): JSX.Element {
  const project = useWindow(shownProject);
  const assessment = useWindow(shownAssessment);
  return (
    <Boundary part={part} drawnFrom={[project, assessment]}>
      {children}
    </Boundary>
  );
}

interface BoundaryProps extends PartProps {
  readonly drawnFrom: readonly unknown[];
}

interface BoundaryState {
  readonly failed: boolean;
}

class Boundary extends Component<BoundaryProps, BoundaryState> {
  override state: BoundaryState = { failed: false };

  static getDerivedStateFromError(): BoundaryState {
    return { failed: true };
  }

  override componentDidCatch(error: unknown, info: ErrorInfo): void {
    console.error(`Drawing ${this.props.part} failed.`, error, info.componentStack);
  }

  override componentDidUpdate(before: BoundaryProps): void {
    const { drawnFrom } = this.props;
    if (this.state.failed && drawnFrom.some((each, place) => each !== before.drawnFrom[place]))
      this.setState({ failed: false });
  }

  override render(): ReactNode {
    if (!this.state.failed) return this.props.children;
    return (
      <div className="part-failed" role="alert">
        <p>
          <b>Could not draw {this.props.part}.</b> The project is safe; save it, or undo the last change.
        </p>
        <button type="button" className="button" onClick={() => this.setState({ failed: false })}>
          Try again
        </button>
      </div>
    );
  }
}
