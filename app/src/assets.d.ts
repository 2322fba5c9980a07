declare module "*.woff2" {
  const asset: { readonly uri: string };
  export default asset;
}
