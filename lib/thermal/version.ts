/** Raised whenever the same scenario may give other figures. */
export const ENGINE_VERSION = '1.1.0'
