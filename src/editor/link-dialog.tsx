import type { Editor } from "@tiptap/core";
import { type FormEvent, useId, useState } from "react";
import { isAllowedHref } from "#shared/document/href.ts";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";
import { TextField } from "#src/components/text-field.tsx";

interface LinkDialogProps {
  editor: Editor;
  onClose(): void;
}

/** Asks for a link's address, and for its words when none are picked. Mounted anew each time it is opened. */
export function LinkDialog({ editor, onClose }: LinkDialogProps) {
  const formId = useId();
  const present = editor.getAttributes("link").href as string | undefined;
  const [href, setHref] = useState(present ?? "");
  const [words, setWords] = useState("");
  const [error, setError] = useState("");
  const needsWords = editor.state.selection.empty && present === undefined;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    event.stopPropagation();
    const address = completeHref(href);
    if (!isAllowedHref(address)) {
      setError(
        "Give an address such as https://example.org, an e-mail address, or a path on this site such as /builds.",
      );
      return;
    }
    onClose();
    setLink(editor, address, needsWords ? words.trim() || href.trim() : null);
  };
  const remove = () => {
    onClose();
    editor.chain().focus().extendMarkRange("link").unsetLink().run();
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={present === undefined ? "Put in a link" : "Change the link"}
      actions={
        <>
          {present === undefined ? null : <Button onClick={remove}>Take the link off</Button>}
          <Button tone="primary" type="submit" form={formId}>
            {present === undefined ? "Put in the link" : "Change the link"}
          </Button>
        </>
      }
    >
      <form id={formId} onSubmit={submit} noValidate className="flex flex-col gap-4">
        <TextField
          label="Address"
          data-focus-first=""
          value={href}
          error={error}
          inputMode="url"
          autoCapitalize="none"
          spellCheck={false}
          onChange={(event) => {
            setHref(event.target.value);
            setError("");
          }}
        />
        {needsWords ? (
          <TextField
            label="Words of the link"
            optional
            help="Without words the address itself is shown."
            value={words}
            onChange={(event) => setWords(event.target.value)}
          />
        ) : null}
      </form>
    </Dialog>
  );
}

function setLink(editor: Editor, href: string, words: string | null): void {
  const chain = editor.chain().focus();
  if (words === null) chain.extendMarkRange("link").setLink({ href }).run();
  else chain.insertContent({ type: "text", text: words, marks: [{ type: "link", attrs: { href } }] }).run();
}

/** Adds what people leave out: `https://` before a host, `mailto:` before an e-mail address. */
export function completeHref(typed: string): string {
  const href = typed.trim();
  if (/^[^\s@/:]+@[^\s@/:]+\.[^\s@/:]+$/.test(href)) return `mailto:${href}`;
  if (/^[\w-]+(\.[\w-]+)+(:\d+)?([/?#].*)?$/.test(href)) return `https://${href}`;
  return href;
}
