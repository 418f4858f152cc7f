/** Who signs in: the demo's people and password are those that the start script prints. */
export type Person = { readonly name: string; readonly email: string; readonly password: string };

const DEMO_PASSWORD = 'marram-demo-2026';

export const ASTA: Person = { name: 'Asta Lyngmose', email: 'asta@marram.invalid', password: DEMO_PASSWORD };
export const MARTHE: Person = {
  name: 'Marthe Rødklit',
  email: 'marthe@marram.invalid',
  password: DEMO_PASSWORD,
};

let made = 0;

/** Somebody whom the server does not know yet. */
export function stranger(name: string): Person {
  made += 1;
  const word = name.toLowerCase().replace(/[^a-z]/g, '');
  return {
    name,
    email: `${word}.${Date.now().toString(36)}${made}@walkers.invalid`,
    password: 'peat and heather 7',
  };
}
