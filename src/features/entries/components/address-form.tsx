import { type FormEvent, useState } from "react";
import type { EntryDraft } from "#shared/contracts/entries.ts";
import { Button } from "#src/components/button.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { paths } from "#src/lib/paths.ts";
import type { Publishing } from "../use-publishing-acts.ts";

interface AddressFormProps {
  draft: EntryDraft;
  publishing: Publishing;
}

/** The last part of the entry's address. Until it is published it follows the title, unless one is chosen here. */
export function AddressForm({ draft, publishing }: AddressFormProps) {
  const [slug, setSlug] = useState(draft.slug);
  const [from, setFrom] = useState(draft.slug);
  if (from !== draft.slug) {
    setFrom(draft.slug);
    setSlug(draft.slug);
  }
  const submit = (event: FormEvent) => {
    event.preventDefault();
    void publishing.act({ act: "rename", slug: slug.trim() });
  };
  return (
    <form onSubmit={submit} noValidate className="flex flex-col items-start gap-3">
      <TextField
        frameClassName="w-full"
        label="Last part of the address"
        help={
          draft.publishedAt === null
            ? "It follows the title until the entry is published."
            : "Links to the old address lead to the new one."
        }
        value={slug}
        error={publishing.fields.slug}
        autoCapitalize="none"
        spellCheck={false}
        onChange={(event) => setSlug(event.target.value)}
      />
      <p className="figures text-xs break-all text-ink-soft">{paths.entry(draft.build.slug, slug || "…")}</p>
      <Button type="submit" disabled={slug.trim() === draft.slug} busy={publishing.busy}>
        Change the address
      </Button>
    </form>
  );
}
