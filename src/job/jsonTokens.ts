/** The tokens of JSON (RFC 8259 §§6, 7) as sticky patterns: set `lastIndex` before each use. */
export const JSON_SPACE = /[ \t\r\n]*/y;
export const JSON_NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?(?![\w.+-])/y;
export const JSON_WORD = /(?:true|false|null)(?!\w)/y;
/** Control characters below U+0020 may not stand in a string as they are; those from U+007F on may. */
export const JSON_STRING = /"(?:[^"\\\p{Cc}]|[\u007f-\u009f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/uy;
