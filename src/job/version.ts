/** The engine's version, printed in every report. */
export const ENGINE_VERSION = '0.1.0';
