/** Raised whenever the same plan may get another finding or verdict. */
export const RULES_VERSION = '1.1.0'
