import { Component, type ReactNode } from 'react';
import { CrashPage } from './CrashPage';

/** The last net: whatever breaks above the router still ends in words and a way on. React itself logs the cause. */
export class ErrorBoundary extends Component<{ children: ReactNode }, { hasFailed: boolean }> {
  override state = { hasFailed: false };

  static getDerivedStateFromError(): { hasFailed: boolean } {
    return { hasFailed: true };
  }

  override render(): ReactNode {
    return this.state.hasFailed ? <CrashPage /> : this.props.children;
  }
}
