import type { EntryDraft } from "#shared/contracts/entries.ts";
import { SelectField } from "#src/components/select-field.tsx";
import { TextArea } from "#src/components/text-area.tsx";
import type { DraftContent } from "../draft-content.ts";

interface EntryFieldsProps {
  draft: EntryDraft;
  content: DraftContent;
  errors: Record<string, string>;
  change(part: Partial<DraftContent>): void;
}

const longest = { title: 140, summary: 300 } as const;

/** Title, summary and stage of an entry. */
export function EntryFields({ draft, content, errors, change }: EntryFieldsProps) {
  const tooLong = (field: "title" | "summary", name: string) => {
    const over = content[field].trim().length - longest[field];
    return over > 0 ? `${name} may be at most ${longest[field]} characters: ${over} too many.` : undefined;
  };
  return (
    <div className="flex flex-col gap-5">
      <TextArea
        label="Title"
        rows={1}
        value={content.title}
        error={tooLong("title", "The title") ?? errors.title}
        placeholder="What this entry is about"
        className="min-h-14! text-xl! leading-tight! font-semibold"
        // A title is one line: Enter would only be lost on saving.
        onKeyDown={(event) => event.key === "Enter" && event.preventDefault()}
        onChange={(event) => change({ title: event.target.value.replaceAll("\n", " ") })}
      />
      <TextArea
        label="Summary"
        optional
        rows={2}
        className="min-h-20!"
        help="One or two sentences, shown in lists and feeds."
        value={content.summary}
        error={tooLong("summary", "The summary") ?? errors.summary}
        onChange={(event) => change({ summary: event.target.value.replaceAll("\n", " ") })}
      />
      <SelectField
        label="Stage"
        frameClassName="max-w-sm"
        value={content.stageId}
        error={errors.stageId}
        options={draft.stages.map(({ id, title }) => ({ value: id, label: title }))}
        onChange={(event) => change({ stageId: event.target.value })}
      />
    </div>
  );
}
