import { Skeleton } from '../ui/skeleton';

/** Exactly as high as the ribbon, so that nothing moves when it comes. */
export const ribbonHeight = (withHighs: boolean): number => (withHighs ? 192 : 176);

export const CoverRibbonSkeleton = ({ withHighs = false }: { withHighs?: boolean }) => <Skeleton className={withHighs ? 'h-48' : 'h-44'} />;
