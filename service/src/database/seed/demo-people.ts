import type { Role } from '../../common/policy';

/** Name of the demo shop. */
export const DEMO_SHOP = 'Kestrel Lane Radio and Television';

/** Four people, one per role. The passwords are printed at start and stand in the README. */
export const DEMO_PEOPLE: { name: string; email: string; role: Role; password: string }[] = [
  {
    name: 'Ines Halvorsen',
    email: 'owner@ohmstead.example',
    role: 'owner',
    password: 'warm-valve-owner',
  },
  {
    name: 'Tomas Brandt',
    email: 'senior@ohmstead.example',
    role: 'senior',
    password: 'warm-valve-senior',
  },
  {
    name: 'Priya Nair',
    email: 'technician@ohmstead.example',
    role: 'technician',
    password: 'warm-valve-technician',
  },
  {
    name: 'Jonah Reyes',
    email: 'trainee@ohmstead.example',
    role: 'trainee',
    password: 'warm-valve-trainee',
  },
];
