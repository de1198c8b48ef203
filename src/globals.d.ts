/** The version in package.json, written in by the build. */
declare const __LAYERHEAD_VERSION__: string;
