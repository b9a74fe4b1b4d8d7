import type { FieldErrors, UseFormRegister } from "react-hook-form";
import type { BuildStatus } from "#shared/contracts/builds.ts";
import { SelectField } from "#src/components/select-field.tsx";
import { TextArea } from "#src/components/text-area.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { buildStatusWords, optionsOf } from "../state-words.ts";

export interface BuildValues {
  title: string;
  purpose: string;
  status?: BuildStatus | undefined;
}

export const buildFieldNames = ["title", "purpose", "status"] as const;

interface BuildFieldsProps {
  register: UseFormRegister<BuildValues>;
  errors: FieldErrors<BuildValues>;
}

/** What a build is called, what it is for and how far it is. */
export function BuildFields({ register, errors }: BuildFieldsProps) {
  return (
    <>
      <TextField
        label="Title"
        help="The machine's name, as readers will know it."
        autoComplete="off"
        error={errors.title?.message}
        {...register("title")}
      />
      <TextArea
        label="Purpose"
        help="One line: what the machine is and what it is for. At most 200 characters."
        rows={2}
        error={errors.purpose?.message}
        {...register("purpose")}
      />
      <SelectField
        label="Status"
        options={optionsOf(buildStatusWords)}
        error={errors.status?.message}
        {...register("status")}
      />
    </>
  );
}
