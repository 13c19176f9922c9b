import { JOB_DEFAULTS } from '../../src/job/defaults.js';
import type { FieldKind } from '../field/kind.js';

/** A row of the table of loads. */
export interface LoadRow {
  readonly key: string;
  readonly label: string;
  readonly kind: FieldKind;
  /** what an empty field says; null: what the row of this key says */
  readonly empty: string;
}

/** The rows below torque and hand, in their order. */
export const LOAD_ROWS: readonly LoadRow[] = [
  { key: 'bending', label: 'bending', kind: ['torque'], empty: 'none' },
  { key: 'axial', label: 'axial', kind: ['force'], empty: 'none' },
  { key: 'twistMax', label: 'twist at most', kind: ['angle', 'twistRate'], empty: 'any' },
  { key: 'shearStressMax', label: 'shear at most', kind: ['stress'], empty: 'any' },
  { key: 'yieldFactor', label: 'yield factor', kind: 'number', empty: String(JOB_DEFAULTS.yieldFactor) },
  { key: 'ultimateFactor', label: 'ultimate factor', kind: 'number', empty: String(JOB_DEFAULTS.ultimateFactor) },
  { key: 'bucklingFactor', label: 'buckling factor', kind: 'number', empty: '' },
];

export const TORQUE_ROW: LoadRow = { key: 'torque', label: 'torque', kind: ['torque'], empty: '' };
