import { fc } from "@fast-check/vitest";
import { describe, expect, it } from "vitest";
