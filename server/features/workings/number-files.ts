import slugify from "@sindresorhus/slugify";
import { type Response, Router } from "express";
import { z } from "zod";
import { invalidInput } from "#server/http/errors.ts";
import { inputsToAddress } from "#shared/calculators/address.ts";
import { type CalculatorRun, findCalculator } from "#shared/calculators/registry.ts";
import type { TemplateSubject, WorkingService } from "./service.ts";

const request = z.object({
  format: z.enum(["csv", "json"], { error: "The numbers come as csv or json." }),
});

type WorkingAddress = { working: string; format: string };
type CalculatorAddress = { calculator: string; format: string };

/** Inputs and results of a working as a file, for whoever may see it; inputs in the query go before the kept ones. */
export function numberFiles({ workings }: { workings: WorkingService }): Router {
  const router = Router();
  router.get<WorkingAddress>("/api/workings/:working/numbers/:format", (req, res) => {
    const { working, format } = req.params;
    send(res, workings.ofWorking(req.viewer, working, Object.entries(req.query)), format);
  });
  router.get<CalculatorAddress>("/api/calculators/:calculator/numbers/:format", (req, res) => {
    const { calculator, format } = req.params;
    send(res, workings.ofCalculator(calculator, Object.entries(req.query)), format);
  });
  return router;
}

function send(res: Response, { run, fileName }: TemplateSubject, format: string): void {
  const wanted = request.safeParse({ format });
  if (!wanted.success) throw invalidInput(wanted.error);
  const name = `${slugify(fileName)}-numbers.${wanted.data.format}`;
  res.set("Cache-Control", "private, no-cache");
  res.set("Content-Disposition", `attachment; filename="${name}"`);
  if (wanted.data.format === "csv") res.type("text/csv; charset=utf-8").send(numbersCsv(run));
  else res.json(run);
}

/** One row a number, RFC 4180; nested ones by their dotted name. The label and unit are there where the site shows them. */
export function numbersCsv(run: CalculatorRun): string {
  const definition = findCalculator(run.calculator);
  const shown = new Map<string, { label: string; unit?: string }>([
    ...(definition?.fields ?? []).map((field) => [`input ${field.name}`, field] as const),
    ...(definition?.resultFields ?? []).map((field) => [`result ${field.name}`, field] as const),
  ]);
  const rows = (kind: string, values: object) =>
    inputsToAddress(values).map(([name, value]) => {
      const { label = "", unit = "" } = shown.get(`${kind} ${name}`) ?? {};
      return [kind, name, label, value, unit];
    });
  const lines = [
    ["kind", "name", "label", "value", "unit"],
    ["sum", "calculator", definition?.name ?? "", run.calculator, ""],
    ["sum", "version", "", String(run.version), ""],
    ...rows("input", run.inputs),
    ...rows("result", run.results),
  ];
  return lines.map((cells) => `${cells.map(cell).join(",")}\r\n`).join("");
}

/** Words that a spreadsheet would take for a formula are made plain words. */
function cell(text: string): string {
  const plain = /^[=+\-@\t\r]/.test(text) && Number.isNaN(Number(text)) ? `'${text}` : text;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
}
