import { createTestApp, type TestApp } from './create-test-app.js';
import { examplePost } from '../src/results/example-post.js';

describe('POST /api/v1/results', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  it('stores the example of the docs and finds 12.14 MΩ', async () => {
    const { body } = await test.post(examplePost).expect(201);
    const impedance = body.measures.find((measure: { name: string }) => measure.name === 'outputImpedance');
    expect(impedance.value / 1e6).toBeCloseTo(12.14, 2);
    expect(impedance.low / 1e6).toBeCloseTo(11.85, 2);
    expect(impedance.high / 1e6).toBeCloseTo(12.44, 2);
    expect(body).toMatchObject({
      verdict: 'pass',
      attempt: 1,
      priorStagePassed: false,
      disposition: 'stop',
      limitSetVersion: 1,
    });
  });
});
