/** The version of the program, as results carry it. */
export const VERSION: string = __LAYERHEAD_VERSION__;
