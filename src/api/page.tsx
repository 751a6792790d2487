import { useSuspenseQueries, type FetchQueryOptions, type UseSuspenseQueryOptions } from '@tanstack/react-query';
import type { ComponentType, JSX } from 'react';
import { useParams, useSearchParams, type LoaderFunctionArgs } from 'react-router-dom';
import { fetchWords } from '../lib/i18n';
import { queryClient } from './query';

/** Where a page stands: the path's names and the filters in the URL. */
export interface Place {
  params: Record<string, string>;
  search: URLSearchParams;
}

// The options of any query, whatever it answers.
interface AnyOptions {
  queryKey: readonly unknown[];
}
type Data<O> = O extends { queryFn?: infer F } ? (F extends (...context: never[]) => infer R ? Awaited<R> : never) : never;
export type Answers<Q> = { [Name in keyof Q]: Data<Q[Name]> };
// Until the queries' names are inferred nothing is known of the view, which any view fits.
type Shown<Q> = string extends keyof Q ? never : Answers<Q> & { place: Place };

interface Page<Q extends Record<string, AnyOptions>> {
  /** The nouns of `locales/` that the view speaks in, fetched beside its answers. */
  words?: string[];
  queries: (place: Place) => Q;
  View: ComponentType<Shown<NoInfer<Q>>>;
}

/** A lazy route whose loader awaits exactly what its view receives. */
export function page<Q extends Record<string, AnyOptions>>({ words = [], queries, View }: Page<Q>) {
  const loader = async ({ params, request }: LoaderFunctionArgs) => {
    const wanted = Object.values(queries({ params: named(params), search: new URL(request.url).searchParams }));
    await Promise.all([...wanted.map((options) => queryClient.ensureQueryData(options as FetchQueryOptions)), fetchWords(words)]);
    return null;
  };

  function Component() {
    const params = named(useParams());
    const [search] = useSearchParams();
    const place = { params, search };
    const wanted = Object.entries(queries(place));
    const answers = useSuspenseQueries({ queries: wanted.map(([, options]) => options as UseSuspenseQueryOptions) });
    // Names and answers keep their order, which the types cannot say.
    const data = Object.fromEntries(wanted.map(([name], i) => [name, answers[i]?.data]));
    const shown = { ...data, place } as unknown as Shown<NoInfer<Q>> & JSX.IntrinsicAttributes;
    return <View {...shown} />;
  }

  return { loader, Component };
}

const named = (params: Record<string, string | undefined>): Record<string, string> =>
  Object.fromEntries(Object.entries(params).filter((entry): entry is [string, string] => entry[1] !== undefined));
