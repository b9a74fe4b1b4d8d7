/** A page for when pages cannot be drawn. Its texts are ours alone, so nothing in it needs escaping. */
export function faultPage(message: string, id: string | undefined): string {
  const number = id ? `<p>Number: <code>${id}</code></p>` : "";
  return `<!doctype html>
<html lang="en-GB">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark"><title>Something broke · Soapstone</title></head>
<body><h1>Something broke</h1><p>${message}</p>${number}<p><a href="/">Go to the front page</a></p></body>
</html>`;
}
