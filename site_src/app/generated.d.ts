// What the packer writes beside these sources and the bundler finds by name.

declare module "gaswright-pack" {
  const pack: import("./protocol").Pack;
  export default pack;
}

declare module "gaswright-worker" {
  const source: string;
  export default source;
}
