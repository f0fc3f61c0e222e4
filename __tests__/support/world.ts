import {
  addendumInput,
  buildUpInput,
  contactInput,
  drawingInput,
  jobInput,
  levelInput,
  placeInput,
  runInput,
  serviceInput,
  specificationInput,
} from './job-inputs';
import { newJob, type Agent } from './job';

/** One of each thing that a path can name, made by one person: its id by the segment before it and the parameter. */
export type World = { ids: Record<string, string>; bodies: Record<string, object> };

/**
 * Everything that the walk over the routes needs to ask for another firm's things: a new route with a parameter adds
 * its id here, and a new write its body, valid in this world.
 */
export async function newWorld(agent: Agent): Promise<World> {
  const { job, path, level, drawing, place, service, where } = await newJob(agent);
  const made = async (name: string, input: object): Promise<string> => {
    const { body } = await agent.post(`${path}/${name}`).send(input).expect(201);
    return String(body.id);
  };
  const contact = await agent.post('/api/contacts').send(contactInput).expect(201);
  const buildUp = buildUpInput(service.id);
  const specification = specificationInput(service.id);
  const run = { ...runInput(where), id: crypto.randomUUID(), version: null };
  await agent
    .patch(`${path}/runs`)
    .send({ put: [run], drop: [] })
    .expect(200);
  const ids = {
    'jobs/:job': job.id,
    'contacts/:contact': String(contact.body.id),
    'runs/:run': run.id,
    'levels/:id': level.id,
    'drawings/:id': drawing.id,
    'places/:id': place.id,
    'services/:id': service.id,
    'addenda/:id': await made('addenda', addendumInput),
    'build-ups/:id': await made('build-ups', buildUp),
    'specification/:id': await made('specification', specification),
  };
  const rows = {
    levels: levelInput,
    drawings: drawingInput,
    places: placeInput,
    services: serviceInput,
    addenda: addendumInput,
    'build-ups': buildUp,
    specification,
  };
  const ofRows = Object.entries(rows).flatMap(([name, input]) => [
    [`POST /jobs/:job/${name}`, input],
    [`PATCH /jobs/:job/${name}/:id`, { ...input, version: 1 }],
  ]);
  return {
    ids,
    bodies: {
      ...Object.fromEntries(ofRows),
      'PATCH /jobs/:job': { ...jobInput, version: 1 },
      'PATCH /contacts/:contact': { ...contactInput, version: 1 },
      'PATCH /jobs/:job/runs': { put: [run], drop: [] },
    },
  };
}

/** The path with this world's ids in it. */
export function pathIn({ ids }: World, path: string): string {
  return path.replace(/([^/]+)\/:(\w+)/g, (pair, segment: string) => {
    const id = ids[pair];
    if (!id) throw new Error(`No id for ${pair}: add one to __tests__/support/world.ts`);
    return `${segment}/${id}`;
  });
}
