/** The engine: a job goes in, a report comes out. */
export type { Brief, FrontAxis, HeldDesign, Job, LoadCase, Pick, Speed, TubeSpec } from './job/job.js';
export { readJob, readJobText, type JobResult } from './job/read.js';
export { writeJob, writeJobText } from './job/write.js';
export { jobDigest } from './job/digest.js';
export type { Limit } from './limit/check.js';
export { METAL_LIMITS } from './limit/index.js';
export { buildLibrary, buildStockLists } from './material/library.js';
export type { Material, Metal, Sizes, StockRow } from './material/material.js';
export type { Problem } from './material/problem.js';
export { readStockCsv } from './material/stockCsv.js';
export { reportCsv } from './report/csv.js';
export type {
  Candidate,
  Design,
  Ease,
  Flag,
  FrontPoint,
  HeldResult,
  LimitEntry,
  LimitId,
  NoFit,
  Relief,
  Report,
} from './report/report.js';
export { reportTable } from './report/table.js';
export { ENGINE_VERSION } from './job/version.js';
export { sizeJob, type Progress } from './sizing/size.js';
