import type { RequestKind, RequestState } from '../../contract/words';

export interface DemoRequest {
  store: string;
  kind: RequestKind;
  words: string;
  state: RequestState;
  /** Hours before now. */
  openedAgo: number;
  assignee?: string;
  /** Days after now. */
  scheduledIn?: number;
  photo?: string;
  talk?: { by: string; words: string; after: number; note?: true }[];
}

/** `store` says it as the store; a staff member is named by the start of their address. */
export const demoRequests: Record<string, DemoRequest[]> = {
  'kestrel-bend': [
    { store: 'Ozark Lane Grocery', kind: 'not-cooling', words: 'It hums but the bags at the front are wet.', state: 'open', openedAgo: 2.5, assignee: 'dana', talk: [{ by: 'dana', words: 'Thank you, we see the air going up as well. Please keep the door shut; we are finding you a technician.', after: 0.4 }, { by: 'dana', words: 'Second time since August. Ask about the breaker.', after: 0.6, note: true }] },
    { store: 'Lantern Corner 14', kind: 'door-or-hinge', words: 'The left door drops when you open it.', state: 'scheduled', openedAgo: 27, assignee: 'priya', scheduledIn: 1, photo: 'hinge', talk: [{ by: 'dana', words: 'Priya comes tomorrow between 8 and 12. Please leave that door shut until then.', after: 3 }, { by: 'rosa', words: 'Thank you. We taped it shut and put up a sign.', after: 4.5 }] },
    { store: 'Campo Verde Tienda', kind: 'ice-quality', words: 'Las bolsas de 7 lb vienen pegadas unas con otras.', state: 'waiting-on-store', openedAgo: 20, assignee: 'iris', photo: 'bags', talk: [{ by: 'iris', words: '¿Nos puede decir el número de lote que viene en la bolsa? Mientras tanto, no las venda, por favor.', after: 1.5 }] },
    { store: 'Juniper Fuel & Bait', kind: 'ice-sooner', words: 'Fishing derby this weekend; the 20 lb will not last until the truck.', state: 'new', openedAgo: 1.2 },
    { store: 'Pelican Row Market', kind: 'light', words: '', state: 'new', openedAgo: 5 },
    { store: 'Harrow Mill Stop', kind: 'missing-ice', words: 'The ticket says 48 bags, we counted 42.', state: 'open', openedAgo: 31, assignee: 'wes', talk: [{ by: 'wes', words: 'Readings agree with the ticket; asking the driver.', after: 2, note: true }] },
    { store: 'Tern Point Marina', kind: 'damaged-bags', words: 'About ten torn bags at the bottom.', state: 'solved', openedAgo: 75, assignee: 'dana', talk: [{ by: 'dana', words: 'The driver took them back this morning and left ten new ones.', after: 24 }] },
    { store: 'Marlow Bridge Mart', kind: 'leak', words: 'Water on the floor in front of the freezer every morning.', state: 'scheduled', openedAgo: 46, assignee: 'priya', scheduledIn: 0, talk: [{ by: 'iris', words: 'Please put out a wet-floor sign and do not reach behind the freezer. Priya is with you today.', after: 5 }] },
    { store: 'Lantern Corner 3', kind: 'move-or-remove', words: 'We remodel next month, the freezer has to go to the other side of the door.', state: 'open', openedAgo: 120, assignee: 'iris' },
    { store: 'Lantern Corner 14', kind: 'light', words: 'The lamp inside flickers.', state: 'solved', openedAgo: 200, assignee: 'priya', talk: [{ by: 'priya', words: 'New lamp fitted.', after: 50 }] },
    { store: 'Stillwater Ford Stop', kind: 'door-or-hinge', words: 'Gasket hangs out at the top.', state: 'closed', openedAgo: 700, assignee: 'priya' },
    { store: 'Elm Square Grocery', kind: 'other', words: 'Who do we call on Sundays?', state: 'closed', openedAgo: 900, assignee: 'dana', talk: [{ by: 'dana', words: 'The number on your store page is answered on Sundays too.', after: 3 }] },
    { store: 'Heron Dock', kind: 'ice-sooner', words: 'Two tour boats came early.', state: 'cancelled', openedAgo: 400 },
  ],
  'puerto-claro': [
    { store: 'La Gaviota 3', kind: 'not-cooling', words: 'El congelador hace ruido y no enfría. Lo desconectamos y lo volvimos a conectar.', state: 'open', openedAgo: 3, assignee: 'elena', talk: [{ by: 'elena', words: 'Gracias. Estamos buscando un técnico para hoy. Mientras tanto, deje la puerta cerrada.', after: 0.5 }] },
    { store: 'Sandbar Fuel', kind: 'ice-sooner', words: 'Busy weekend ahead, could the truck come a day sooner?', state: 'new', openedAgo: 6 },
    { store: 'Muelle Viejo', kind: 'door-or-hinge', words: 'La puerta derecha no cierra bien.', state: 'scheduled', openedAgo: 30, assignee: 'beto', scheduledIn: 2, photo: 'hinge', talk: [{ by: 'elena', words: 'Beto pasa pasado mañana por la mañana. Mientras tanto, mantenga esa puerta cerrada, por favor.', after: 2 }] },
    { store: 'Abarrotes Huizache', kind: 'leak', words: 'Amanece agua frente al congelador.', state: 'waiting-on-store', openedAgo: 50, assignee: 'elena', talk: [{ by: 'elena', words: '¿Nos puede enviar una foto de la parte de atrás? No mueva el congelador, por favor.', after: 3 }, { by: 'elena', words: 'Revisar el desagüe; pasó lo mismo en julio.', after: 3.2, note: true }] },
    { store: 'Abarrotes Nopal', kind: 'missing-ice', words: 'Faltaron seis bolsas de 10 libras.', state: 'solved', openedAgo: 100, assignee: 'elena', talk: [{ by: 'elena', words: 'Se las dejamos hoy sin costo.', after: 20 }] },
    { store: 'La Gaviota 3', kind: 'light', words: 'No prende el foco de adentro.', state: 'closed', openedAgo: 520, assignee: 'beto', talk: [{ by: 'beto', words: 'Foco nuevo instalado.', after: 45 }] },
    { store: 'Embarcadero Sur', kind: 'ice-sooner', words: 'Llegaron antes los camaroneros.', state: 'cancelled', openedAgo: 260 },
  ],
};
