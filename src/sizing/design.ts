import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Design } from '../report/report.js';
import { Section } from '../tube/section.js';
import { Mass } from './mass.js';
import { worstTorque } from './twisted.js';

/** What a report shows of a tube; the price is that of the listed size, if it has one, per metre. */
export function designOf(
  job: Job,
  metal: Metal,
  outerDiameter: number,
  wall: number,
  pricePerMetre: number | null,
): Design {
  const { length } = job.tube;
  const section = new Section(metal.wallTolerance).set(outerDiameter, wall);
  const torsionalStiffness = (metal.shearModulus * section.polarMoment) / length;
  const mass = new Mass(metal.density, length).of(outerDiameter, wall);
  const largest = Math.max(...job.loads.map(({ torque }) => Math.abs(torque)));
  return {
    outerDiameter,
    wall,
    bore: outerDiameter - 2 * wall,
    meanRadius: section.meanRadius,
    mass,
    twist: worstTorque(job) / torsionalStiffness,
    torsionalStiffness,
    strainEnergy: (largest * largest) / (2 * torsionalStiffness),
    cost: costOf(metal, mass, length, pricePerMetre),
    layup: null,
  };
}

function costOf(metal: Metal, mass: number, length: number, pricePerMetre: number | null): number | null {
  if (pricePerMetre !== null) return pricePerMetre * length;
  return metal.pricePerKilogram === null ? null : metal.pricePerKilogram * mass;
}
