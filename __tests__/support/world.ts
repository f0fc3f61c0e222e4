import { revisionSchema } from '@/api/contracts/revision';
import { sessionSchema } from '@/api/contracts/session';
import type { Services } from '@/api/services/services';

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
export async function newWorld(agent: Agent, services: Services): Promise<World> {
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
  const contactIds = [String(contact.body.id)];
  await agent
    .patch(path)
    .send({ ...jobInput, contactIds, version: 1 })
    .expect(200);
  const send = { contactIds, subject: 'Takeoff', words: 'Attached.' };
  const { revision, message } = await frozen(agent, { services, path, send });
  const ids = {
    'jobs/:job': job.id,
    'revisions/:revision': revision,
    'messages/:message': message,
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
      'POST /revisions/:revision/mail-preview': send,
      'POST /revisions/:revision/messages': { ...send, again: true },
      'POST /messages/:message/settle': { as: 'not-sent', version: 1 },
    },
  };
}

type Freezing = { services: Services; path: string; send: object };
/** A revision of the job, rendered as the worker does it, and a message that waits to be sent. */
async function frozen(agent: Agent, { services, path, send }: Freezing) {
  const { body } = await agent.post(`${path}/revisions`).send({}).expect(201);
  const revision = revisionSchema.parse(body);
  const session = sessionSchema.parse((await agent.get('/api/session').expect(200)).body);
  await services.rendering.render({ firmId: session.firm.id, revisionId: revision.id });
  const sent = await agent.post(`/api/revisions/${revision.id}/messages`).send(send).expect(202);
  return { revision: revision.id, message: revisionSchema.parse(sent.body).messages[0]!.id };
}

/** The path with this world's ids in it. */
export function pathIn({ ids }: World, path: string): string {
  return path.replace(/([^/]+)\/:(\w+)/g, (pair, segment: string) => {
    const id = ids[pair];
    if (!id) throw new Error(`No id for ${pair}: add one to __tests__/support/world.ts`);
    return `${segment}/${id}`;
  });
}
