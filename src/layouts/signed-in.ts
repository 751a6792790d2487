import { redirect, type LoaderFunctionArgs } from 'react-router-dom';
import i18next from 'i18next';
import { api } from '../../server/contract/index';
import { call, Problem } from '../api/call';
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
  const me = queryClient.getQueryData<Me>(meQuery.queryKey) ?? (await firstMeeting());
  if (me) return me;
  const { pathname, search } = new URL(request.url);
  throw redirect(paths.signIn(pathname + search));
}

/** The person's own language wins over what this browser remembered. */
async function firstMeeting(): Promise<Me | null> {
  const { me } = await call(api.auth.readSession, {});
  if (!me) return null;
  queryClient.setQueryData(meQuery.queryKey, me);
  await startLanguage();
  if (me.person.language !== i18next.language) await setLanguage(me.person.language);
  return me;
}
