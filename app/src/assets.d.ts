/** The bundler answers the address that the file is served from. */
declare module "*.woff2" {
  const address: string;
  export default address;
}

/** Only in tests, whose runner knows it. */
declare module "*?raw" {
  const text: string;
  export default text;
}
