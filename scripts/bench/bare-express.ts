import { readFileSync } from "node:fs";
import type { AddressInfo } from "node:net";
import express from "express";

/** What the entry page is measured against: Express, one route, the same bytes. */
const html = readFileSync(process.argv[2] ?? "", "utf8");
const app = express();
app.disable("etag");
app.get("/", (_req, res) => {
  res.type("html").send(html);
});
const server = app.listen(0, () => {
  process.stdout.write(`${(server.address() as AddressInfo).port}\n`);
});
