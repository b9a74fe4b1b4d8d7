/** A stand-in photo for the kit page: a bead with its heat tint, drawn. */
const svg = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 1500 1000"><defs><linearGradient id="g" x2="0" y2="1"><stop offset="0" stop-color="#59636a"/><stop offset=".34" stop-color="#7d8488"/><stop offset=".42" stop-color="#47617e"/><stop offset=".46" stop-color="#6b4a7c"/><stop offset=".49" stop-color="#a06b3d"/><stop offset=".52" stop-color="#cda84c"/><stop offset=".6" stop-color="#a9adad"/><stop offset="1" stop-color="#3f474c"/></linearGradient></defs><path fill="url(#g)" d="M0 0h1500v1000H0z"/><path d="M-40 470h1600" stroke="#8f9497" stroke-width="92" stroke-dasharray="34 8" stroke-linecap="round"/></svg>`;

export const kitPicture = `data:image/svg+xml,${encodeURIComponent(svg)}`;
export const kitThumbhash = "3OcRJYB4d3h/iIeHeEh3eIhw+j2w";
