import { data } from "react-router";

export async function load(): Promise<never> {
  throw data(null, { status: 404 });
}

/** Never drawn: `load` always hands over to the error page. */
export function Component() {
  return null;
}
