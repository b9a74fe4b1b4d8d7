import { z } from "zod";
import { id, moment, requiredLine, slug } from "./common.ts";
import { endpoint } from "./endpoint.ts";
import { photoView } from "./photos.ts";

export const role = z.enum(["reader", "moderator", "administrator"]);

/** How lengths are shown to this person. Stored values are always mm. */
export const unitPreference = z.enum(["mm", "inch"]);

export type UnitPreference = z.infer<typeof unitPreference>;

/** A person as others see them beside what they made. */
export const personSummary = z.object({
  handle: slug,
  name: z.string(),
  avatar: photoView.nullable(),
});

export type PersonSummary = z.infer<typeof personSummary>;

/** The signed-in person, as their own pages need them. */
export const me = personSummary.extend({
  id,
  email: z.string(),
  emailVerified: z.boolean(),
  bio: z.string(),
  units: unitPreference,
  role,
  /** True once the person has started a build. */
  isBuilder: z.boolean(),
});

export type Me = z.infer<typeof me>;

export const getMe = endpoint({
  method: "GET",
  path: "/api/me",
  access: "anyone",
  summary: "The signed-in person, or null",
  response: z.object({ me: me.nullable() }),
});

/** The name a person goes by here. */
export const displayName = requiredLine("Display name", 60);

export const updateProfileBody = z.object({
  name: displayName.optional(),
  bio: z.string().trim().max(600, "The text about you may be at most 600 characters.").optional(),
  units: unitPreference.optional(),
  avatarPhotoId: id.nullable().optional(),
});

export type UpdateProfileBody = z.infer<typeof updateProfileBody>;

export const updateProfile = endpoint({
  method: "PATCH",
  path: "/api/me",
  access: "signed_in",
  summary: "Change one's own profile",
  body: updateProfileBody,
  response: me,
});

/** A person's public page; their builds come from `listBuilds` by owner. */
export const personPage = personSummary.extend({ bio: z.string(), since: moment });

export type PersonPage = z.infer<typeof personPage>;

export const getPerson = endpoint({
  method: "GET",
  path: "/api/people/:handle",
  access: "anyone",
  summary: "A person's public page",
  params: z.object({ handle: slug }),
  response: personPage,
});
