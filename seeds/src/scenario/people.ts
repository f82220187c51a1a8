/** The people of Saltmarsh Rotor Works, invented. Their passwords are for a demonstration on loopback only. */
export const PEOPLE = {
  ines: {
    name: 'Ines Hollin',
    email: 'ines@saltmarsh.example',
    password: 'curlew-over-saltmarsh',
    does: 'aerodynamicist',
  },
  marek: {
    name: 'Marek Aldous',
    email: 'marek@saltmarsh.example',
    password: 'bittern-in-the-reeds',
    does: 'aerodynamicist',
  },
  tove: {
    name: 'Tove Verrade',
    email: 'tove@saltmarsh.example',
    password: 'lapwing-at-low-tide',
    does: 'lead',
  },
  priya: {
    name: 'Priya Oduya',
    email: 'priya@saltmarsh.example',
    password: 'plover-reads-the-mud',
    does: 'reader (structures)',
  },
  wren: {
    name: 'Wren Castell',
    email: 'wren@saltmarsh.example',
    password: 'heron-keeps-the-keys',
    does: 'administrator',
  },
} as const;

export type DemoPerson = keyof typeof PEOPLE;

/** The sign-ins as `npm start` prints them. */
export function signInTable(): string {
  const rows = Object.values(PEOPLE).map(
    ({ name, email, password, does }) => `  ${email.padEnd(26)}${password.padEnd(24)}${name}, ${does}`,
  );
  return ['Demo sign-ins (all invented):', ...rows].join('\n');
}
