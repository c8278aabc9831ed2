/** Part of every build's identity: outputs may change only together with it. */
export const COMPILER_VERSION = '0.2.0';
