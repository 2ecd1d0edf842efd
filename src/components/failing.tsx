import { Component, type ReactNode } from 'react';

interface FailingProps {
  readonly fallback: (problem: unknown) => ReactNode;
  readonly children: ReactNode;
}

/** Keeps what goes wrong within from taking the page down. */
export class Failing extends Component<FailingProps, { readonly problem: unknown }> {
  override state: { readonly problem: unknown } = { problem: null };

  static getDerivedStateFromError(problem: unknown) {
    return { problem };
  }

  override render() {
    return this.state.problem === null
      ? this.props.children
      : this.props.fallback(this.state.problem);
  }
}
