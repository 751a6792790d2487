/** An answer that was made as JSON already: a hot list, put together from what the database keeps. */
export class MadeJson {
  constructor(readonly text: string) {}
}

export const madeJson = (text: string): MadeJson => new MadeJson(text);
