import { type ComponentType, createContext } from "react";
import type { PhotoAttributes, WorkingAttributes } from "#shared/document/types.ts";

/** The blocks that belong to features; src/app gives their components, so that this folder knows none. */
export interface DocumentSlots {
  photo: ComponentType<PhotoAttributes>;
  photoGroup: ComponentType<{ photos: PhotoAttributes[] }>;
  working: ComponentType<WorkingAttributes>;
}

export const SlotsContext = createContext<DocumentSlots | null>(null);
