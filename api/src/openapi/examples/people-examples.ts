import type { PersonName, Session } from '@second-spanner/shared/contracts/people';

export const tomasz: PersonName = {
  id: '0c8a1b52-7d0f-4c8e-8a6c-0f1a2b3c4d5e',
  name: 'Tomasz Brandt',
  role: 'builder',
};

export const imogen: PersonName = {
  id: '1d9b2c63-8e1a-4d9f-9b7d-1a2b3c4d5e6f',
  name: 'Imogen Vale',
  role: 'countersigner',
};

export const session: Session = {
  person: { ...tomasz, email: 'tomasz@lowmill.example', dialect: null },
  shop: {
    ...{ id: '2eac3d74-9f2b-4eaa-8c8e-2b3c4d5e6f70', name: 'Low Mill Motor Works' },
    ...{ dialect: 'british', demo: true },
  },
};
