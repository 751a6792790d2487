import { useId, type ChangeEvent, type ReactNode } from 'react';
import { Camera, ImagePlus, X } from 'lucide-react';
import { FieldError } from './field';
import { usePicture } from './use-picture';

export interface FileInputWords {
  add: string;
  /** Offered where there is a finger rather than a mouse. */
  camera: string;
  remove: (name: string) => string;
  preview: (name: string) => string;
  /** Such as "2 of 5 photos". */
  count: string;
}

interface Props {
  label: string;
  hint?: string;
  error?: string;
  files: readonly File[];
  onChange: (files: File[]) => void;
  max: number;
  accept: string;
  words: FileInputWords;
}

/** Photos: chosen or taken, shown small, removable. The files are the caller's, who also checks them. */
export function FileInput({ label, hint, error, files, onChange, max, accept, words }: Props) {
  const id = useId();
  const describedBy = [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ') || undefined;
  const add = (more: File[]) => onChange([...files, ...more].slice(0, max));
  return (
    <fieldset aria-describedby={describedBy}>
      <legend className="font-semibold">{label}</legend>
      {hint && (
        <p id={`${id}-hint`} className="text-body text-ink-3">
          {hint}
        </p>
      )}
      <ul className="mt-2 flex flex-wrap gap-2">
        {files.map((file) => (
          <Photo key={`${file.name} ${file.lastModified} ${file.size}`} file={file} words={words} onRemove={() => onChange(files.filter((other) => other !== file))} />
        ))}
        {files.length < max && <Pickers accept={accept} words={words} add={add} />}
      </ul>
      <p role="status" className="mt-1 text-small text-ink-3">
        {files.length > 0 && words.count}
      </p>
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </fieldset>
  );
}

function Photo({ file, words, onRemove }: { file: File; words: FileInputWords; onRemove: () => void }) {
  return (
    <li className="relative">
      <img ref={usePicture(file)} alt={words.preview(file.name)} className="size-24 rounded-control border border-edge object-cover" />
      <button type="button" aria-label={words.remove(file.name)} onClick={onRemove} className="absolute top-0 right-0 grid size-12 place-items-start justify-items-end p-1">
        <span className="grid size-7 place-items-center rounded-full border border-edge bg-surface text-ink">
          <X aria-hidden size={16} />
        </span>
      </button>
    </li>
  );
}

interface PickerProps {
  accept: string;
  add: (files: File[]) => void;
}

const Pickers = ({ words, ...props }: PickerProps & { words: FileInputWords }) => (
  <>
    <li className="hidden pointer-coarse:block">
      <Picker {...props} camera icon={<Camera aria-hidden size={22} />} label={words.camera} />
    </li>
    <li>
      <Picker {...props} icon={<ImagePlus aria-hidden size={22} />} label={words.add} />
    </li>
  </>
);

function Picker({ accept, add, camera = false, icon, label }: PickerProps & { camera?: boolean; icon: ReactNode; label: string }) {
  const choose = ({ target }: ChangeEvent<HTMLInputElement>) => {
    add([...(target.files ?? [])]);
    // The same file may be chosen again after it was removed.
    target.value = '';
  };
  return (
    <label className="grid size-24 cursor-pointer place-content-center justify-items-center gap-1 rounded-control border border-dashed border-edge px-1 text-center text-small font-semibold text-fjord hover:bg-fjord-tint has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-fjord">
      {icon}
      {label}
      <input type="file" accept={accept} multiple={!camera} capture={camera ? 'environment' : undefined} onChange={choose} className="sr-only" />
    </label>
  );
}
