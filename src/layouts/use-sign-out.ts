import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { api } from '../../server/contract/index';
import { useAct } from '../api/act';
import { paths } from '../paths';
import { isSignedOut } from './signed-in';

/** Ends this session and forgets everything it was told; a session that had ended already is as good. */
export function useSignOut(): () => void {
  const { mutate } = useAct(api.auth.signOut, []);
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const leave = async () => {
    await navigate(paths.signIn());
    queryClient.clear();
  };
  return () => mutate({}, { onSuccess: () => void leave(), onError: (problem) => void (isSignedOut(problem) && leave()) });
}
