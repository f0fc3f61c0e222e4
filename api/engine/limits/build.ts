import { EngineError } from '../engine-error';
import { type MadeDiameter, madeDiameter, nestedDiameter, onNominal } from '../standards/made-diameters';
import type { Material } from '../standards/rows';
import { millimetreLabel, nominalThickness, type ThicknessName } from '../standards/thickness-name';
import { isWrap, pipeTables, wrapShare } from './choice-of-series';
import type { Body, LayerInput } from './study-types';

/** The layers as they are put up, from the inside out. Lengths in m. */
export type Build = {
  /** of the outermost layer; null: bare */
  name: ThicknessName | null;
  names: ThicknessName[];
  thicknesses: number[];
  materials: Material[];
  /** finished, of cylinders; null for flats and rectangular ducts */
  outsideDiameter: number | null;
  basis: 'made' | 'nominal' | 'bare';
  notes: string[];
};

type Pipe = Extract<Body, { shape: 'pipe' }>;

export const bareBuild = (body: Body): Build => ({
  name: null,
  names: [],
  thicknesses: [],
  materials: [],
  outsideDiameter: bareDiameter(body),
  basis: 'bare',
  notes: [],
});

/**
 * The layers with the outermost at one made thickness: on pipes by made outside diameters, layer on layer; on all else
 * by nominal thickness, a wrap by what is left of it once put up.
 *
 * @param body - what is insulated
 * @param layers - from the inside out, the inner ones named
 * @param name - of the outermost layer
 * @returns undefined when a table says that this is not made for this pipe
 * @throws EngineError when an inner layer has no thickness
 */
export function buildOf(body: Body, layers: readonly LayerInput[], name: ThicknessName): Build | undefined {
  const named = layers.map((layer, place) => namedLayer(layer, place === layers.length - 1 ? name : null));
  return body.shape === 'pipe' ? pipeBuild(body, named) : flatBuild(body, named);
}

type NamedLayer = { material: Material; name: ThicknessName; installed: number | null; isSpecified: boolean };

function namedLayer({ material, thickness, installed }: LayerInput, outermost: ThicknessName | null): NamedLayer {
  const name = outermost ?? thickness;
  if (name === null) throw new EngineError('An inner layer must have a thickness', 'layers');
  return { material, name, installed: thickness === name ? installed : null, isSpecified: thickness === name };
}

function pipeBuild(body: Pipe, layers: readonly NamedLayer[]): Build | undefined {
  const diameters = [body.outsideDiameter];
  const notes: string[] = [];
  let basis: 'made' | 'nominal' = 'made';
  for (const layer of layers) {
    const made = layerDiameter(body, layer, { inner: diameters.at(-1) ?? NaN, isFirst: diameters.length === 1 });
    if (!made) return undefined;
    if (made.basis === 'nominal') {
      basis = 'nominal';
      notes.push(nominalNote(layer.name, diameters.length === 1));
    }
    diameters.push(made.outsideDiameter);
  }
  const thicknesses = layers.map((_, place) => ((diameters[place + 1] ?? NaN) - (diameters[place] ?? NaN)) / 2);
  const outer = layers.at(-1)?.name ?? null;
  return { ...common(layers), name: outer, thicknesses, outsideDiameter: diameters.at(-1) ?? null, basis, notes };
}

/** A specified name that is not made for this pipe is still judged, at nominal thickness. */
function layerDiameter(
  body: Pipe,
  { material, name, isSpecified }: NamedLayer,
  { inner, isFirst }: { inner: number; isFirst: boolean },
): MadeDiameter | undefined {
  const tables = pipeTables(material, name);
  const made = isFirst ? madeDiameter(body, name, tables) : nestedDiameter(inner, name, tables);
  return made ?? (isSpecified ? onNominal(inner, name) : undefined);
}

const nominalNote = (name: ThicknessName, isFirst: boolean): string =>
  isFirst
    ? `${millimetreLabel(name)} mm: nominal thickness on the pipe, no made diameter known.`
    : `${millimetreLabel(name)} mm: no made section is known to nest on the layer inside, nominal thickness taken.`;

function flatBuild(body: Body, layers: readonly NamedLayer[]): Build {
  const notes: string[] = [];
  const thicknesses = layers.map((layer) => {
    const thickness = putUpThickness(layer);
    if (isWrap(layer.material, layer.name)) notes.push(wrapNote(layer, thickness));
    return thickness;
  });
  const whole = thicknesses.reduce((sum, thickness) => sum + thickness, 0);
  const bare = bareDiameter(body);
  const outsideDiameter = bare === null ? null : bare + 2 * whole;
  const name = layers.at(-1)?.name ?? null;
  return { ...common(layers), name, thicknesses, outsideDiameter, basis: 'nominal', notes };
}

const common = (layers: readonly NamedLayer[]) => ({
  names: layers.map(({ name }) => name),
  materials: layers.map(({ material }) => material),
});

function putUpThickness({ material, name, installed }: NamedLayer): number {
  if (installed !== null) return installed;
  return nominalThickness(name) * (isWrap(material, name) ? wrapShare : 1);
}

const wrapNote = ({ name, installed }: NamedLayer, thickness: number): string =>
  `${millimetreLabel(name)} mm wrap is judged at its installed ${(thickness * 1000).toFixed(1)} mm${
    installed === null ? ', 25 % compressed' : ''
  }.`;

export function bareDiameter(body: Body): number | null {
  if (body.shape === 'pipe') return body.outsideDiameter;
  return body.shape === 'round-duct' || body.shape === 'vessel' ? body.diameter : null;
}

export const wholeThickness = ({ thicknesses }: Build): number =>
  thicknesses.reduce((sum, thickness) => sum + thickness, 0);
