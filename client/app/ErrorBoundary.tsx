import { Component, type ReactNode } from "react";
import { ErrorPage } from "./ErrorPage";

type Props = { children: ReactNode /** A new value is a new try. */; resetKey: string };
type State = { error: unknown; failedAt: string | null };

/** Shows the error page in place of a page that broke, until another address is opened. */
export class ErrorBoundary extends Component<Props, State> {
  override state: State = { error: null, failedAt: null };

  static getDerivedStateFromError(error: unknown): Partial<State> {
    return { error, failedAt: "" };
  }

  static getDerivedStateFromProps({ resetKey }: Props, { failedAt }: State): Partial<State> | null {
    if (failedAt === "") return { failedAt: resetKey };
    if (failedAt !== null && failedAt !== resetKey) return { error: null, failedAt: null };
    return null;
  }

  override render() {
    return this.state.failedAt === null ? this.props.children : <ErrorPage error={this.state.error} />;
  }
}
