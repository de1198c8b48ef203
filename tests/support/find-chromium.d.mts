export declare function findChromium(
  env?: Readonly<Record<string, string | undefined>>,
): { readonly path: string } | { readonly path: null; readonly reason: string };
