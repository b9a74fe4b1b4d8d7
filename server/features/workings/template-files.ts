import slugify from "@sindresorhus/slugify";
import { type Response, Router } from "express";
import { rateLimit } from "express-rate-limit";
import { z } from "zod";
import { AppError, invalidInput } from "#server/http/errors.ts";
import { findCalculator, templateOf } from "#shared/calculators/registry.ts";
import { templateDxf } from "#shared/templates/dxf.ts";
import type { TemplateNames, TemplateSheet } from "#shared/templates/sheet.ts";
import { templateSvg } from "#shared/templates/svg.ts";
import { type Paper, tileSheet } from "#shared/templates/tiling.ts";
import type { TemplateSubject, WorkingService } from "./service.ts";
import { templatePdf } from "./template-pdf.ts";

interface TemplateParts {
  workings: WorkingService;
  clock: () => number;
}

const request = z.object({
  format: z.enum(["pdf", "svg", "dxf"], { error: "A template comes as pdf, svg or dxf." }),
  paper: z.enum(["a4", "letter"], { error: "The paper is a4 or letter." }).default("a4"),
});

type WorkingAddress = { working: string; format: string };
type CalculatorAddress = { calculator: string; format: string };

/**
 * Full-size templates as files, for whoever may see the working. Inputs in the query go before the kept ones, so that
 * a reader prints the numbers on the screen.
 */
export function templateFiles({ workings, clock }: TemplateParts): Router {
  const router = Router();

  async function send(
    res: Response,
    subject: TemplateSubject,
    format: unknown,
    paper: unknown,
  ): Promise<void> {
    const wanted = request.safeParse({ format, paper });
    if (!wanted.success) throw invalidInput(wanted.error);
    const names = { build: subject.build, working: subject.working, date: printedDate(clock()) };
    const sheet = templateOf(subject.run, names);
    if (!sheet) throw new AppError("not_found", "This calculator has no template.");
    res.set("Cache-Control", "private, no-cache");
    const stem = `${slugify(subject.fileName)}-template`;
    if (wanted.data.format === "pdf") {
      const file = await pdfOf(subject, sheet, names, wanted.data.paper);
      res.set("Content-Disposition", `inline; filename="${stem}-${wanted.data.paper}.pdf"`);
      res.type("application/pdf").send(file);
      return;
    }
    const svg = wanted.data.format === "svg";
    res.set("Content-Disposition", `attachment; filename="${stem}.${wanted.data.format}"`);
    res.type(svg ? "image/svg+xml; charset=utf-8" : "image/vnd.dxf");
    res.send(Buffer.from(svg ? templateSvg(sheet, names) : templateDxf(sheet, names)));
  }

  const limit = pdfLimit();
  router.get<WorkingAddress>("/api/workings/:working/template/:format", limit, async (req, res) => {
    const { paper, inputs } = readQuery(req.query);
    await send(res, workings.ofWorking(req.viewer, req.params.working, inputs), req.params.format, paper);
  });
  router.get<CalculatorAddress>("/api/calculators/:calculator/template/:format", limit, async (req, res) => {
    const { paper, inputs } = readQuery(req.query);
    await send(res, workings.ofCalculator(req.params.calculator, inputs), req.params.format, paper);
  });
  return router;
}

async function pdfOf(
  { run }: TemplateSubject,
  sheet: TemplateSheet,
  names: TemplateNames,
  paper: Paper,
): Promise<Buffer> {
  const tiling = tileSheet(sheet.bounds, paper);
  if (!tiling.ok) throw new AppError("invalid_input", tiling.issue.message, { field: "paper" });
  const definition = findCalculator(run.calculator);
  return templatePdf({
    sheet,
    tiling: tiling.value,
    names,
    heading: definition?.name ?? run.calculator,
    cautions: definition?.cautions ?? [],
  });
}

/** Drawing a PDF takes some tens of milliseconds: many a minute from one address are not a person printing. */
function pdfLimit() {
  return rateLimit({
    windowMs: 60_000,
    limit: 30,
    standardHeaders: "draft-8",
    legacyHeaders: false,
    skip: (req) => req.params.format !== "pdf",
    handler: () => {
      throw new AppError("rate_limited", "That is a lot of templates at once. Wait a minute and try again.");
    },
  });
}

/** The paper is the file's; everything else in the query is an input. */
function readQuery({ paper, ...inputs }: Record<string, unknown>) {
  return { paper, inputs: Object.entries(inputs) };
}

function printedDate(moment: number): string {
  return new Intl.DateTimeFormat("en-GB", { dateStyle: "long", timeZone: "UTC" }).format(moment);
}
