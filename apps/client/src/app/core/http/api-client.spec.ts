import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { id } from '@ligament/domain/contract/primitives';
import { route } from '@ligament/domain/contract/route';
import * as z from 'zod';
import { ApiClient } from './api-client';

const CHANGE = route({
  method: 'patch',
  path: '/api/flaws/:id/sizes/:size',
  summary: 'Change a size',
  access: 'flaws.write',
  versioned: true,
  params: z.object({ id, size: z.string() }),
  query: z.object({ search: z.string().optional(), limit: z.number().optional() }),
  body: z.strictObject({ depthMm: z.number() }),
  response: z.object({ version: z.number() }),
});

describe('ApiClient', () => {
  let api: ApiClient;
  let server: HttpTestingController;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting()],
    });
    api = TestBed.inject(ApiClient);
    server = TestBed.inject(HttpTestingController);
  });

  it('fills the address and sends body, version and idempotency key', () => {
    api
      .call(CHANGE, {
        params: { id: 'f 1', size: 'a/b' },
        body: { depthMm: 4.6 },
        version: 7,
        idempotencyKey: 'once',
      })
      .subscribe();
    const { request } = server.expectOne('/api/flaws/f%201/sizes/a%2Fb');
    expect(request.method).toBe('PATCH');
    expect(request.body).toEqual({ depthMm: 4.6 });
    expect(request.headers.get('If-Match')).toBe('"7"');
    expect(request.headers.get('Idempotency-Key')).toBe('once');
  });

  it('leaves out empty query values and headers nobody asked for', () => {
    api
      .call(CHANGE, { params: { id: '1', size: '2' }, query: { search: '', limit: 50 } })
      .subscribe();
    const { request } = server.expectOne((each) => each.url === '/api/flaws/1/sizes/2');
    expect(request.params.toString()).toBe('limit=50');
    expect(request.headers.keys()).toEqual([]);
  });

  it('gives the answer of the server', () => {
    const versions: number[] = [];
    api
      .call(CHANGE, { params: { id: '1', size: '2' } })
      .subscribe(({ version }) => versions.push(version));
    server.expectOne('/api/flaws/1/sizes/2').flush({ version: 8 });
    expect(versions).toEqual([8]);
  });
});
