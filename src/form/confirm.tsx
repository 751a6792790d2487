import type { ReactNode } from 'react';
import type { Problem } from '../api/call';
import { Button, ButtonRow, type ButtonVariant } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { ProblemNote } from './problem-note';

interface Props {
  title: string;
  yes: string;
  no: string;
  variant?: ButtonVariant;
  /** What is asked of the server, where something is. */
  act?: { isPending: boolean; error: Problem | null };
  onYes: () => void;
  onClose: () => void;
  /** What it does. */
  children: ReactNode;
}

/** Asks before an act, for as long as it is drawn; what the server refuses is said there too. */
export const Confirm = ({ title, yes, no, variant = 'danger', act, onYes, onClose, children }: Props) => (
  <Dialog open title={title} onClose={onClose}>
    <div className="grid gap-4">
      {children}
      {act?.error && <ProblemNote problem={act.error} />}
      <ButtonRow>
        <Button variant={variant} size="big" busy={act?.isPending} onClick={onYes}>
          {yes}
        </Button>
        <Button variant="quiet" size="big" onClick={onClose}>
          {no}
        </Button>
      </ButtonRow>
    </div>
  </Dialog>
);
