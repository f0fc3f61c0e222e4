import type { PipeStandard } from '../standards/rows';
import type { Body } from './study-types';

/** Emittance of a surface without insulation or finish, as new (low) and aged (high). */
export type BareSurface = { emittanceNew: number; emittanceAged: number; source: string };

const table = 'ASHRAE Handbook Fundamentals 2021 ch. 23 Table 12';
const steel: BareSurface = { emittanceNew: 0.8, emittanceAged: 0.8, source: `bare iron or steel, ${table}` };
const copper: BareSurface = {
  emittanceNew: 0.03,
  emittanceAged: 0.8,
  source: `bare copper, polished to oxidized, ${table}`,
};
const galvanized: BareSurface = {
  emittanceNew: 0.1,
  emittanceAged: 0.44,
  source: `galvanized sheet, new ${table}, dusty ISO 12241 from memory`,
};
const plastic: BareSurface = {
  emittanceNew: 0.9,
  emittanceAged: 0.94,
  source: 'plastic and other non-metals, ISO 12241 from memory',
};

const ofPipe: Record<PipeStandard, BareSurface> = {
  'asme-steel': steel,
  'en-10255': steel,
  'en-10220': steel,
  'astm-copper': copper,
  'en-1057': copper,
  'cpvc-ips': plastic,
  'pvc-ips': plastic,
  'cpvc-cts': plastic,
  'pex-cts': plastic,
};

/** Ducts are taken as galvanized, equipment and pipe of no standard as steel. */
export function bareSurface(body: Body): BareSurface {
  if (body.shape === 'pipe') return body.standard ? ofPipe[body.standard] : steel;
  return body.shape === 'round-duct' || body.shape === 'rectangular-duct' ? galvanized : steel;
}
