import type { Ref } from "react";

type Props = {
  camera: Ref<HTMLInputElement>;
  chooser: Ref<HTMLInputElement>;
  accept: string;
  onFiles: (files: File[]) => void;
};

/** Hidden; buttons and the p key open them. Emptied after each choice, so that the same file can be chosen again. */
export function FileInputs({ camera, chooser, accept, onFiles }: Props) {
  const take = (input: HTMLInputElement) => {
    const files = [...(input.files ?? [])];
    input.value = "";
    if (files.length > 0) onFiles(files);
  };
  return (
    <>
      <input
        ref={camera}
        hidden
        type="file"
        accept="image/*"
        capture="environment"
        onChange={(event) => take(event.currentTarget)}
        data-testid="camera"
      />
      <input
        ref={chooser}
        hidden
        type="file"
        multiple
        accept={accept}
        onChange={(event) => take(event.currentTarget)}
        data-testid="files"
      />
    </>
  );
}
