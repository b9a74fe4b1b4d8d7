export function Component() {
  return <h1>Soapstone</h1>;
}
