import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../paths';

/** Signed in: forget what was known of anybody before, and go on to where the person was going. */
export function useEnter(next: string | null): () => void {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  return () => {
    queryClient.clear();
    void navigate(next ?? paths.home(), { replace: true });
  };
}
