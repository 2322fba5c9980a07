/** The bundler answers the address that the file is served from. */
declare module "*.woff2" {
  const address: string;
  export default address;
}
