import { once } from 'node:events';
import request from 'supertest';
import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../functions/catalogue.ts';
import { MAX_BODY_BYTES } from '../../../server/http/body.ts';
import { byName } from '../../../server/http/serving.ts';
import { serverError } from '../../../server/problems.ts';
import { appOf, kettle } from './appOf.ts';

const app = appOf([kettle]);

describe('requests of programs', () => {
  it('are told of the workbooks, the functions and that the server lives', async () => {
    expect((await request(app).get('/healthz')).body).toEqual({ status: 'ok' });
    expect((await request(app).get('/v1/workbooks')).body).toMatchObject({
      workbooks: [
        { name: 'kettle', title: 'Ester kettle, trial 7', inputs: [{ name: 'acid', unit: 'mol', min: 0 }] },
      ],
    });
    const { functions } = (await request(app).get('/v1/functions')).body as { functions: { name: string }[] };
    expect(functions.map(({ name }) => name)).toEqual(catalogue.map(({ name }) => name));
  });

  it('are answered with the evaluation', async () => {
    const response = await evaluate({ workbook: 'kettle', inputs: { acid: 1 } });
    expect(response.status).toBe(200);
    expect(response.body).toMatchObject({
      evaluation: 1,
      inputs: { acid: { value: 1 } },
      outputs: { extent: { value: expect.closeTo(0.8727, 4) as number } },
    });
  });

  it('may leave out the inputs', async () => {
    expect((await evaluate({ workbook: 'kettle' })).body).toMatchObject({ inputs: { acid: { value: 2 } } });
  });
});

describe('a request is refused, as problem details, when', () => {
  it.each<[string, number, string, () => request.Test]>([
    ['its page is unknown', 404, 'page-unknown', () => request(app).get('/etc/passwd')],
    [
      'it tries to leave the folder',
      404,
      'page-unknown',
      () => request(app).get('/sheets/..%2f..%2fetc%2fpasswd/x'),
    ],
    ['it names a file', 404, 'workbook-unknown', () => request(app).get('/sheets/..%2f..%2fpackage.json')],
    ['its address is broken', 400, 'request-unreadable', () => request(app).get('/sheets/%ff')],
    ['its method is another', 405, 'method-unknown', () => request(app).delete('/v1/evaluate')],
    ['its method is another on a page', 405, 'method-unknown', () => request(app).post('/sheets/kettle')],
    ['its host is another', 403, 'host-foreign', () => request(app).get('/').set('Host', 'evil.example')],
    ['its port is another', 403, 'host-foreign', () => request(app).get('/').set('Host', '127.0.0.1:1')],
    [
      'its host begins like ours',
      403,
      'host-foreign',
      () => request(app).get('/').set('Host', '127.0.0.1.evil.example'),
    ],
    [
      'another page made it',
      403,
      'origin-foreign',
      () => request(app).get('/').set('Origin', 'http://evil.example'),
    ],
    [
      'a page without origin made it',
      403,
      'origin-foreign',
      () => request(app).get('/').set('Origin', 'null'),
    ],
    ['another site sent it', 403, 'origin-foreign', () => posted('{}').set('Sec-Fetch-Site', 'cross-site')],
    [
      'another site embeds it',
      403,
      'origin-foreign',
      () => request(app).get('/').set('Sec-Fetch-Site', 'cross-site'),
    ],
    [
      'its body is a form',
      415,
      'body-kind',
      () => request(app).post('/v1/evaluate').type('form').send('a=1'),
    ],
    ['its body is text', 415, 'body-kind', () => request(app).post('/v1/evaluate').type('text').send('{}')],
    ['its body has no kind', 415, 'body-kind', () => request(app).post('/v1/evaluate')],
    [
      'its body is in an odd alphabet',
      415,
      'body-kind',
      () => posted('{}').set('Content-Type', 'application/json; charset=latin1'),
    ],
    ['its body is no JSON', 400, 'body-unreadable', () => posted('{')],
    [
      'its body is too large',
      413,
      'body-too-large',
      () => posted(JSON.stringify('x'.repeat(MAX_BODY_BYTES))),
    ],
    ['its body has another shape', 422, 'body-shape', () => evaluate({ workbook: 3 })],
    [
      'its body has more in it',
      422,
      'body-shape',
      () => evaluate({ workbook: 'kettle', file: '/etc/passwd' }),
    ],
    ['an input is a list', 422, 'body-shape', () => evaluate({ workbook: 'kettle', inputs: { acid: [1] } })],
    ['an input is empty', 422, 'body-shape', () => evaluate({ workbook: 'kettle', inputs: { acid: null } })],
    ['the inputs are a list', 422, 'body-shape', () => evaluate({ workbook: 'kettle', inputs: [1] })],
    ['its workbook is unknown', 404, 'workbook-unknown', () => evaluate({ workbook: 'kettel' })],
    [
      'its input is unknown',
      422,
      'given-unknown',
      () => posted('{"workbook":"kettle","inputs":{"__proto__":1}}'),
    ],
    [
      'an input is a formula',
      422,
      'given-kind',
      () => evaluate({ workbook: 'kettle', inputs: { acid: '=1+1' } }),
    ],
    [
      'an input is outside its limits',
      422,
      'given-limits',
      () => evaluate({ workbook: 'kettle', inputs: { acid: -1 } }),
    ],
  ])('%s', async (_, status, code, send) => {
    const response = await send();
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toEqual({
      type: 'about:blank',
      title: expect.stringMatching(/^[A-Z]/) as string,
      status,
      detail: expect.stringMatching(/[.?]$/) as string,
      code,
    });
    expect(response.status).toBe(status);
  });

  it.each([
    [[], 'the body does not fit: it is an object with the name of a workbook'],
    [{}, 'workbook does not fit: it is the name of a workbook, a text'],
    [
      { workbook: 'kettle', file: 'x' },
      'the body does not fit: it has file, and takes only workbook and inputs',
    ],
    [{ workbook: 'kettle', inputs: [1] }, 'inputs does not fit: its values are numbers'],
  ])('its body is %j, and says why in our own words', async (body, says) => {
    const { detail } = (await evaluate(body)).body as { detail: string };
    expect(detail).toContain(says);
    expect(detail).not.toMatch(/invalid|unrecognized/i);
  });

  it('the server itself is at fault, without saying how it is made', async () => {
    const broken = appOf([kettle], { evaluate: () => Promise.reject(new Error('a secret path')) });
    const { status, text } = await request(broken).get('/sheets/kettle');
    expect(status).toBe(500);
    expect(text).not.toContain('secret');
  });

  it('too many wait already', async () => {
    const busy = appOf([kettle], {
      evaluate: () => Promise.reject(serverError('server-busy', { count: 16 })),
    });
    expect((await request(busy).get('/sheets/kettle')).status).toBe(503);
  });
});

describe('a request is let in', () => {
  it('from a page of the server itself, and by a link of another site', async () => {
    const server = app.listen(0, '127.0.0.1');
    await once(server, 'listening');
    const { port } = server.address() as { port: number };
    const own = {
      Host: `localhost:${port}`,
      Origin: `http://localhost:${port}`,
      'Sec-Fetch-Site': 'same-origin',
    };
    expect((await request(server).get('/healthz').set(own)).status).toBe(200);
    const link = { 'Sec-Fetch-Site': 'cross-site', 'Sec-Fetch-Mode': 'navigate' };
    expect((await request(server).get('/healthz').set(link)).status).toBe(200);
    server.close();
  });
});

it('two workbooks of one name are not served', () => {
  expect(() => byName([kettle, kettle])).toThrow('kettle.yaml and kettle.yaml would both be shown as kettle');
});

function evaluate(body: object): request.Test {
  return posted(JSON.stringify(body));
}

function posted(body: string): request.Test {
  return request(app).post('/v1/evaluate').type('application/json').send(body);
}
