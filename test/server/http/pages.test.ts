import { createHash } from 'node:crypto';
import request from 'supertest';
import { describe, expect, it } from 'vitest';
import type { Workbook } from '../../../server/workbook/model.ts';
import { workbookWith } from '../engine/hostOf.ts';
import { appOf, kettle } from './appOf.ts';

const HOSTILE = '<script>alert(1)</script>" style="x';
const hostile: Workbook = workbookWith(
  { A1: HOSTILE, A2: '=1/0' },
  {
    title: HOSTILE,
    about: HOSTILE,
    file: 'a b&c.yaml',
    inputs: [{ name: 'word', cell: 'S!A1', unit: null, min: null, max: null, uncertainty: null }],
    outputs: [{ name: 'out', cell: 'S!A2', unit: HOSTILE, digits: null }],
  },
);
const app = appOf([kettle, hostile]);

describe('the list of sheets', () => {
  it('names the program, leads to each sheet, tells what it is about, and shows the caution', async () => {
    const { status, text, type } = await request(app).get('/');
    expect({ status, type }).toEqual({ status: 200, type: 'text/html' });
    expect(text).toContain('<a href="/sheets/kettle">Ester kettle, trial 7</a>');
    expect(text).toContain('<a href="/sheets/a%20b%26c">');
    expect(text).toContain('Invented example.');
    expect(text).toContain('<h1>Evenkeel: calculation sheets</h1>');
    expect(text).toContain('<td>1 output</td>');
    expect(text).toContain('has signed its title block');
    expect(text).toContain('Local codes, the law and licensed practice come first.');
  });

  it('tells of own functions and their digest', async () => {
    const own = { file: 'plant.mjs', sha256: 'abc123', functions: [] };
    const { text } = await request(appOf([kettle], { ownFunctions: own })).get('/');
    expect(text).toMatch(/plant\.mjs[\s\S]*abc123/);
  });
});

describe('a sheet', () => {
  it('is the report, each given value a field with its unit and limits', async () => {
    const { status, text } = await request(app).get('/sheets/kettle');
    expect(status).toBe(200);
    expect(text).toContain('<form method="get" action="/sheets/kettle">');
    expect(text).toMatch(/<input\s+type="number"[^>]*\sname="acid"[^>]*\svalue="2"[^>]*\smin="0"/);
    expect(text).toContain('>1.5195<');
    expect(text).toContain('Local codes, the law and licensed practice come first.');
  });

  it('is worked again for the values in its address', async () => {
    const { text } = await request(app).get('/sheets/kettle').query({ acid: '1.0' });
    expect(text).toMatch(/<input\s+type="number"[^>]*\svalue="1"/);
    expect(text).toContain('>0.87267<');
    expect(text).toContain('Worked with other values than the workbook’s own: acid.');
    expect(text).toMatch(/the workbook has <data value="2" >2<\/data>/);
  });

  it.each([
    ['acid=-1', 'outside its limits'],
    ['acid=', 'is a number'],
    ['acid=%3D1%2B1', 'is a number, and =1+1 is none'],
    ['acid=1&acid=2', 'is given twice'],
    ['__proto__=1', 'no input __proto__'],
    ['constructor=1', 'no input constructor'],
  ])('does not take ?%s', async (query, says) => {
    const response = await request(app).get(`/sheets/kettle?${query}`);
    expect(response.status).toBe(422);
    expect((response.body as { detail: string }).detail).toContain(says);
  });

  it('tells a browser on a page what was wrong', async () => {
    const { status, text, type } = await request(app)
      .get('/sheets/kettle?acid=%3Cb%3E')
      .set('Accept', 'text/html,application/xhtml+xml,application/xml;q=0.9,*/*;q=0.8');
    expect({ status, type }).toEqual({ status: 422, type: 'text/html' });
    expect(text).toContain('&lt;b&gt; is none');
  });

  it('ends at the time limit', async () => {
    const bomb = workbookWith({ A1: '=SUM(SEQUENCE(30000, 1000))' }, { file: 'bomb.yaml' });
    const response = await request(appOf([bomb])).get('/sheets/bomb');
    expect(response.status).toBe(422);
    expect(response.body).toMatchObject({
      code: 'time-limit',
      detail: expect.stringContaining('bomb.yaml') as string,
    });
  });
});

describe('every page', () => {
  const ADDRESSES = [
    '/',
    '/sheets/kettle',
    '/sheets/a%20b%26c',
    '/sheets/a%20b%26c?word=%3Cscript%3E',
    '/nowhere',
  ];

  it.each(ADDRESSES)('%s loads nothing from elsewhere and holds no script', async (address) => {
    const { text } = await request(app).get(address).set('Accept', 'text/html');
    const active = /<script|<[^>]* on\w+=|javascript:|<link|<img|<iframe|url\((?!#)|@import/i;
    expect(active.exec(text)?.[0]).toBeUndefined();
    const elsewhere = [...text.matchAll(/(?:href|src|action)="([^"]*)"/g)].filter(
      ([, to]) => !/^[/#]/.test(to!),
    );
    expect(elsewhere).toEqual([]);
  });

  it.each(ADDRESSES)('%s allows its own styles and nothing else', async (address) => {
    const { text, headers } = await request(app).get(address).set('Accept', 'text/html');
    const policy = (headers as Record<string, string>)['content-security-policy']!;
    expect(policy).toContain("default-src 'none'; style-src-elem 'sha256-");
    expect(policy).not.toMatch(/unsafe-inline|unsafe-eval|script-src|\*/);
    const styles = [
      ...text.matchAll(/<style>([\s\S]*?)<\/style>/g),
      ...text.matchAll(/<[^>]*\sstyle="([^"]*)"[^>]*>/g),
    ];
    expect(styles.length).toBeGreaterThan(0);
    for (const [, style] of styles) {
      expect(policy).toContain(`'sha256-${createHash('sha256').update(style!).digest('base64')}'`);
    }
  });
});
