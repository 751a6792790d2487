import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import i18next from 'i18next';
import { signedInMark } from '../../server/contract/auth';
import { Problem } from '../api/call';
import { queryClient } from '../api/query';
import { setLanguage, startLanguage } from '../lib/i18n';
import { membershipAt, meQuery, rememberProducer, type Me } from '../lib/me';
import { paths } from '../paths';
import { landingOf } from './landing';

/** Lets nobody past who is not signed in; keeps where they were going. */
export async function signedIn({ request }: LoaderFunctionArgs) {
  await whoIsIt(request);
  return null;
}

/** The front page is the most useful page of the producer last looked at; stays only for somebody without any. */
export async function land({ request }: LoaderFunctionArgs) {
  const member = membershipAt(await whoIsIt(request), undefined);
  if (member) throw redirect(landingOf(member));
  return null;
}

/** A producer in the path must be one of the person's own. */
export async function atProducer({ request, params }: LoaderFunctionArgs) {
  const member = membershipAt(await whoIsIt(request), params.producer);
  if (!member) throw new Problem('not-found', 404);
  rememberProducer(member.producer.slug);
  return null;
}

export async function landAtProducer({ request, params }: LoaderFunctionArgs) {
  const member = membershipAt(await whoIsIt(request), params.producer);
  if (member) throw redirect(landingOf(member));
  return null;
}

export const isSignedOut = (error: unknown): boolean => error instanceof Problem && error.type === 'not-signed-in';

async function whoIsIt(request: Request): Promise<Me> {
  const known = queryClient.getQueryData<Me>(meQuery.queryKey);
  if (known) return known;
  const { pathname, search } = new URL(request.url);
  if (!markedSignedIn()) throw redirect(paths.signIn(pathname + search));
  try {
    return await firstMeeting();
  } catch (error) {
    if (!isSignedOut(error)) throw error;
    document.cookie = `${signedInMark}=; Max-Age=0; Path=/`;
    throw redirect(paths.signIn(pathname + search));
  }
}

const markedSignedIn = (): boolean => document.cookie.split('; ').some((cookie) => cookie.startsWith(`${signedInMark}=`));

/** The person's own language wins over what this browser remembered. */
async function firstMeeting(): Promise<Me> {
  const me = await queryClient.ensureQueryData(meQuery);
  await startLanguage();
  if (me.person.language !== i18next.language) await setLanguage(me.person.language);
  return me;
}
