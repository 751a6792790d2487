import { maxLogoBytes } from '../../../server/contract/settings';

export const logoTypes = ['image/png', 'image/jpeg', 'image/webp'];

/** What is wrong with a picture, as far as a browser knows; the server looks into it. */
export function logoFault({ type, size }: Pick<File, 'type' | 'size'>): 'wrong-kind' | 'too-large' | null {
  if (!logoTypes.includes(type)) return 'wrong-kind';
  return size > maxLogoBytes ? 'too-large' : null;
}
