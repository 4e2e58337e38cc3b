import { asAdmin, templateName } from './database';

export default async function globalTeardown(): Promise<void> {
  await asAdmin(`DROP DATABASE IF EXISTS ${templateName()} WITH (FORCE)`);
}
