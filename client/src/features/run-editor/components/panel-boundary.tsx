import { Button } from '@mantine/core';
import { Component } from 'react';
import type { ReactNode } from 'react';
import { useWords } from '../../../hooks/use-words';
import classes from './workbench.module.css';

interface Props {
  children: ReactNode;
  /** Said instead of the general sentence. */
  words?: string;
}

/** A panel that broke says so and leaves the rest of the page alone. */
export class PanelBoundary extends Component<Props, { isBroken: boolean }> {
  override state = { isBroken: false };

  static getDerivedStateFromError() {
    return { isBroken: true };
  }

  override componentDidCatch(error: unknown) {
    console.error(error);
  }

  override render() {
    if (!this.state.isBroken) return this.props.children;
    return <Broken words={this.props.words} onRetry={() => this.setState({ isBroken: false })} />;
  }
}

function Broken({ words, onRetry }: { words?: string; onRetry: () => void }) {
  const { say } = useWords();
  return (
    <div className={`${classes.panel} ${classes.boundary}`} role="alert">
      <p>{words ?? say('workbench.states.panelBroken')}</p>
      <Button onClick={onRetry}>{say('workbench.states.panelRetry')}</Button>
    </div>
  );
}
