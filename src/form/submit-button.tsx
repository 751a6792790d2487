import type { ReactNode } from 'react';
import { Button } from '../ui/button';
import { useFormPending } from './form-pending';

interface Props {
  wide?: boolean;
  children: ReactNode;
}

/** Sends the form around it, once. */
export function SubmitButton({ wide, children }: Props) {
  return (
    <div>
      <Button type="submit" size="big" wide={wide} busy={useFormPending()}>
        {children}
      </Button>
    </div>
  );
}
