import type { BuildUpInput, Layer } from '@/api/contracts/build-up';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';

export type Named = { id: string; name: string };
export type DnSize = { dn: number; nominal: string; outsideDiameter: number };
type NamedService = Named & { states: readonly { nature: 'hot' | 'cold' }[] };
/** What a row of a build-up or a specification names by id, as a person reads it. */
export type CoveringNames = {
  units: UnitSystem;
  services: readonly NamedService[];
  places: readonly Named[];
  materials: readonly Named[];
  finishes: readonly Named[];
  sizes: readonly DnSize[];
};

export const bodyWords: Record<BuildUpInput['appliesTo'], string> = {
  pipe: 'Pipes',
  duct: 'Ducts',
  equipment: 'Equipment',
};

export const retarderWords: Record<BuildUpInput['vapourRetarder'], string> = {
  none: 'None',
  'sealed-facing': 'Sealed facing',
  'closed-cell': 'Closed cells, sealed joints',
  'mastic-and-mesh': 'Mastic and mesh',
};

export const nameIn = (rows: readonly Named[], id: string): string => rows.find((row) => row.id === id)?.name ?? '';

/** A material or finish without what stands in brackets: for columns and lines of layers. */
export const shortName = (name: string): string => name.replace(/ ?\([^)]*\)/g, '').trim();

/** DN in SI, NPS in inch-pound: the same size under its two names. */
export function dnText(dn: number, { units, sizes }: Pick<CoveringNames, 'units' | 'sizes'>): string {
  const size = sizes.find((row) => row.dn === dn);
  return units === 'IP' && size ? size.nominal : `DN ${dn}`;
}

type Band = Pick<BuildUpInput, 'appliesTo' | 'fromDn' | 'toDn'>;

/** "DN 40 to 200", "DN 65 and over", "up to DN 32", "All sizes". */
export function bandText({ fromDn, toDn }: Band, names: Pick<CoveringNames, 'units' | 'sizes'>): string {
  if (fromDn === null && toDn === null) return 'All pipe sizes';
  if (fromDn === null) return `up to ${dnText(toDn!, names)}`;
  if (toDn === null) return `${dnText(fromDn, names)} and over`;
  if (fromDn === toDn) return dnText(fromDn, names);
  return `${dnText(fromDn, names)} to ${dnText(toDn, names).replace(/^(DN|NPS) /, '')}`;
}

export const placesText = (placeIds: readonly string[], places: readonly Named[]): string =>
  placeIds.length === 0 ? 'Everywhere' : placeIds.map((id) => nameIn(places, id)).join(', ');

/** One layer: "51 mm mineral fibre pipe insulation"; left open it names only the material. */
export function layerText(layer: Layer, { units, materials }: Pick<CoveringNames, 'units' | 'materials'>): string {
  const name = shortName(nameIn(materials, layer.materialId));
  const put = layer.installed ? `, ${showWithUnit('dimension', layer.installed.value, { units })} as put up` : '';
  return layer.thickness === null ? name : `${thicknessText([layer.thickness], units)} ${lowerFirst(name)}${put}`;
}

const lowerFirst = (text: string) => (/^[A-Z]-/.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1));

/** Thicknesses from the inside out, "38 + 38 mm"; what is left open reads "to be found". */
export function thicknessesText(layers: readonly Layer[], units: UnitSystem): string {
  const names = layers.flatMap(({ thickness }) => thickness ?? []);
  if (names.length === layers.length) return thicknessText(names, units);
  return names.length === 0 ? 'to be found' : `${thicknessText(names, units)} + to be found`;
}

/** Materials from the inside out, each named once while it repeats. */
export function materialsText(layers: readonly Layer[], materials: readonly Named[]): string {
  const names = layers.map(({ materialId }) => shortName(nameIn(materials, materialId)));
  return names.filter((name, index) => name !== names[index - 1]).join(', then ');
}

/** All that a row says, as a person reads it. */
export function coveringFacts(row: BuildUpInput, names: CoveringNames) {
  return [
    { term: 'Service', value: nameIn(names.services, row.serviceId) },
    { term: 'Applies to', value: bodyWords[row.appliesTo] },
    { term: 'Places', value: placesText(row.placeIds, names.places) },
    { term: 'Sizes', value: row.appliesTo === 'pipe' ? bandText(row, names) : '' },
    ...row.layers.map((layer, index) => ({
      term: row.layers.length > 1 ? `Layer ${index + 1}` : 'Layer',
      value: `${layerText(layer, names)}${layer.thickness === null ? ', thickness left to the study' : ''}`,
    })),
    { term: 'Finish', value: nameIn(names.finishes, row.finishId) },
    { term: 'Vapour retarder', value: retarderWords[row.vapourRetarder] },
    { term: 'Note', value: row.note },
  ];
}
