import { z } from "zod";

const common = { name: z.string(), link: z.string() };

/** Every letter the site writes, with what stands in it. Kept in the job queue until it is sent. */
export const letter = z.discriminatedUnion("kind", [
  z.object({ kind: z.literal("verify_address"), ...common }),
  z.object({ kind: z.literal("account_exists"), ...common, resetLink: z.string() }),
  z.object({ kind: z.literal("reset_password"), ...common }),
  z.object({ kind: z.literal("confirm_new_address"), ...common, newEmail: z.string() }),
  z.object({ kind: z.literal("address_change_asked"), ...common, newEmail: z.string() }),
]);

export type Letter = z.infer<typeof letter>;

/** The letter of one kind. */
export type LetterOf<Kind extends Letter["kind"]> = Extract<Letter, { kind: Kind }>;
