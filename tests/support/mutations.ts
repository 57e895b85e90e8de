import { as, type TestPlant } from './test-plant';

/** Makes some history of known length: an invitation each. */
export async function makeHistory(plant: TestPlant, entries: number): Promise<void> {
  for (let index = 0; index < entries; index += 1) {
    const answer = await as(plant.app, plant.administrator)
      .post('/api/users')
      .send({ name: `Person ${index}`, email: `person.${index}@example.org`, role: 'planner' });
    if (answer.status !== 201) throw new Error(`invitation ${index} answered ${answer.status}`);
  }
}
