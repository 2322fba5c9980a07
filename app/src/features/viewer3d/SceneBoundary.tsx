import { Component, type ReactNode } from "react";

interface SceneBoundaryProps {
  readonly onFailed: () => void;
  readonly children: ReactNode;
}

interface SceneBoundaryState {
  readonly hasFailed: boolean;
}

/** The 3-D view failing to load or to draw must not take the screen with it. React knows no such thing but a class. */
export class SceneBoundary extends Component<SceneBoundaryProps, SceneBoundaryState> {
  override state: SceneBoundaryState = { hasFailed: false };

  static getDerivedStateFromError(): SceneBoundaryState {
    return { hasFailed: true };
  }

  override componentDidCatch(): void {
    this.props.onFailed();
  }

  override render(): ReactNode {
    return this.state.hasFailed ? null : this.props.children;
  }
}
