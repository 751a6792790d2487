import { useCallback } from 'react';

/** Shows a chosen file in the image it is the ref of. */
export const usePicture = (file: File) =>
  useCallback(
    (image: HTMLImageElement) => {
      const url = URL.createObjectURL(file);
      image.src = url;
      return () => URL.revokeObjectURL(url);
    },
    [file],
  );
