import type { ReactNode } from 'react';

/** For those who hear the page. */
export const VisuallyHidden = ({ children }: { children: ReactNode }) => <span className="sr-only">{children}</span>;
