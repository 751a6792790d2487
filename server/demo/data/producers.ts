import type { Defrost, Language, Role, Side, Span } from '../../contract/words';

/** The invented world. Mail ends in `.example`, telephone numbers are 555-01xx. */

export interface DemoPerson {
  name: string;
  email: string;
  language: Language;
  role: Role;
  side?: Side;
  /** Names of stores, or of a district, or of an account. */
  stores?: string[];
  district?: string;
  account?: string;
}

export interface DemoModel {
  name: string;
  width: number;
  depth: number;
  height: number;
  doors: number;
  rated: number;
  defrost: Defrost;
}

export interface DemoProducer {
  slug: string;
  name: string;
  language: Language;
  urgentPhone: string;
  /** Of stores that have somebody nearer to call, by name. */
  urgentPhones: Record<string, string>;
  serviceHours: Span[];
  mailSender: { name: string; replyTo: string };
  serialPrefix: string;
  lotPrefix: string;
  /** Seven digits; 952 is what GS1 keeps for examples. */
  gtinPrefix: string;
  region: string;
  /** South-west and north-east corners of where its stores stand. */
  area: [latitude: number, longitude: number][];
  districts: string[];
  accounts: { number: string; name: string; stores: string[]; language: Language }[];
  towns: string[];
  streets: string[];
  people: DemoPerson[];
  /** Stores whose first freezer holds two sizes, and which. */
  layouts: Record<string, [number, number]>;
  /** Stores whose second freezer has no sensor, and the one whose sensor came yesterday. */
  unfitted: string[];
  newlyFitted: string;
  /** Where what is the matter. */
  troubles: Record<'broken' | 'silent' | 'short' | 'late' | 'morning' | 'hungry', string>;
}

export const twoDoor: DemoModel = { name: 'Two-door 900', width: 58, depth: 27, height: 48, doors: 2, rated: 900, defrost: 'cold_wall' };

export const models: DemoModel[] = [
  twoDoor,
  { name: 'Two-door tall 1300', width: 64, depth: 30, height: 58, doors: 2, rated: 1300, defrost: 'auto' },
  { name: 'Three-door 1700', width: 84, depth: 31, height: 56, doors: 3, rated: 1700, defrost: 'auto' },
  { name: 'One-door 500', width: 36, depth: 26, height: 50, doors: 1, rated: 500, defrost: 'cold_wall' },
];

export const bagSizes = [7, 10, 20];

const lanterns = Array.from({ length: 22 }, (_, i) => `Lantern Corner ${i + 1}`);

export const kestrelBend: DemoProducer = {
  slug: 'kestrel-bend',
  name: 'Kestrel Bend Ice',
  language: 'en',
  urgentPhone: '(417) 555-0100',
  urgentPhones: { 'Juniper Fuel & Bait': '(870) 555-0145', 'Ozark Lane Grocery': '(417) 555-0134' },
  serviceHours: [
    { days: [1, 2, 3, 4, 5], from: '06:00', to: '18:00' },
    { days: [6], from: '07:00', to: '13:00' },
  ],
  mailSender: { name: 'Kestrel Bend Ice', replyTo: 'service@kestrelbend.example' },
  serialPrefix: 'urn:dev:os:32473-kb-',
  lotPrefix: 'KB',
  gtinPrefix: '9524170',
  region: 'AR',
  area: [[35.75, -94.2], [36.45, -92.3]],
  districts: ['North of the river', 'South of the river', 'Lakeside'],
  accounts: [
    { number: '1001', name: 'Lantern Corner Stores', stores: lanterns, language: 'en' },
    {
      number: '1002',
      name: 'Harrow and Marlow Fuel',
      language: 'en',
      stores: ['Harrow Mill Stop', 'Marlow Bridge Mart', 'Marlow South', 'Harrow Junction', 'Cedar Gap Fuel', 'Stillwater Ford Stop', 'Gray Fox Fuel', 'Bellwether Pumps', 'Hollow Pine Stop', 'Quarry Road Fuel', 'Ridgeway Stop', 'Three Oaks Fuel', 'Weir Street Mart', 'Sycamore Stop'],
    },
    {
      number: '1003',
      name: 'Ozark Lane Grocers',
      language: 'en',
      stores: ['Ozark Lane Grocery', 'Pelican Row Market', 'Tern Point Market', 'Elm Square Grocery', 'Mill Pond Market', 'Orchard Hill Grocery', 'Redbud Market', 'Foxglove Grocery', 'Limestone Market', 'Persimmon Grocery', 'Town Branch Market', 'Walnut Grove Grocery'],
    },
    {
      number: '1004',
      name: 'Bait, boats and corner shops',
      language: 'en',
      stores: ['Juniper Fuel & Bait', 'Campo Verde Tienda', 'Tern Point Marina', 'Heron Dock', 'Bluegill Bait', 'La Esquina de Alma', 'Driftwood Marina', 'Kingfisher Bait', 'Crooked Creek Store', 'Boat Ramp Nine', 'Cattail Cove', 'Old Ferry Store'],
    },
  ],
  towns: ['Alder Creek', 'Kestrel Bend', 'Harrow Mill', 'Marlow', 'Cedar Gap', 'Tern Point', 'Stillwater Ford', 'Gray Fox', 'Pine Hollow', 'Limestone'],
  streets: ['Tamarack Road', 'Mill Street', 'County Road 9', 'Quarry Road', 'Lakeshore Drive', 'Ferry Road', 'Old Post Road', 'Weir Street', 'Ridge Road'],
  people: [
    { name: 'Nora Whitfield', email: 'nora@kestrelbend.example', language: 'en', role: 'producer-admin' },
    { name: 'Wes Tillman', email: 'wes@kestrelbend.example', language: 'en', role: 'dispatcher' },
    { name: 'Dana Whitlock', email: 'dana@kestrelbend.example', language: 'en', role: 'support-agent' },
    { name: 'Iris Calloway', email: 'iris@kestrelbend.example', language: 'en', role: 'support-agent' },
    { name: 'Cal Hendry', email: 'cal@kestrelbend.example', language: 'en', role: 'driver' },
    { name: 'Priya Olander', email: 'priya@kestrelbend.example', language: 'en', role: 'technician' },
    { name: 'Joel Marsh', email: 'joel@kestrelbend.example', language: 'en', role: 'district-rep', district: 'Lakeside' },
    { name: 'Teresa Vance', email: 'teresa@lanterncorner.example', language: 'en', role: 'district-rep', side: 'store', account: 'Lantern Corner Stores' },
    { name: 'Rosa Iturbe', email: 'rosa@lanterncorner.example', language: 'en', role: 'store-manager', stores: ['Lantern Corner 14'] },
    { name: 'Marisol Quiroga', email: 'marisol@campoverde.example', language: 'es', role: 'store-manager', stores: ['Campo Verde Tienda'] },
    { name: 'Hank Boone', email: 'hank@juniperbait.example', language: 'en', role: 'store-manager', stores: ['Juniper Fuel & Bait', 'Tern Point Marina', 'Heron Dock'] },
    { name: 'Lena Ashby', email: 'lena@ozarklane.example', language: 'en', role: 'store-manager', stores: ['Ozark Lane Grocery'] },
  ],
  layouts: { 'Juniper Fuel & Bait': [7, 20], 'Campo Verde Tienda': [7, 20], 'Lantern Corner 14': [7, 20], 'Tern Point Marina': [10, 20] },
  unfitted: ['Lantern Corner 14', 'Cattail Cove'],
  newlyFitted: 'Heron Dock',
  troubles: {
    broken: 'Ozark Lane Grocery',
    silent: 'Pelican Row Market',
    short: 'Campo Verde Tienda',
    late: 'Marlow Bridge Mart',
    morning: 'Tern Point Marina',
    hungry: 'Juniper Fuel & Bait',
  },
};

export const puertoClaro: DemoProducer = {
  slug: 'puerto-claro',
  name: 'Hielo Puerto Claro',
  language: 'es',
  urgentPhone: '(361) 555-0160',
  urgentPhones: { 'La Gaviota 3': '(361) 555-0173', 'Sandbar Fuel': '(361) 555-0184' },
  serviceHours: [{ days: [1, 2, 3, 4, 5, 6], from: '06:00', to: '17:00' }],
  mailSender: { name: 'Hielo Puerto Claro', replyTo: 'servicio@puertoclaro.example' },
  serialPrefix: 'urn:dev:os:32473-pc-',
  lotPrefix: 'PC',
  gtinPrefix: '9523610',
  region: 'TX',
  area: [[27.55, -97.85], [28.35, -97.0]],
  districts: ['Bahía', 'Tierra adentro'],
  accounts: [
    { number: '2001', name: 'Tiendas La Gaviota', language: 'es', stores: ['La Gaviota 1', 'La Gaviota 2', 'La Gaviota 3', 'La Gaviota 4', 'La Gaviota 5', 'La Gaviota 6', 'La Gaviota 7'] },
    { number: '2002', name: 'Carnada y combustible del Golfo', language: 'es', stores: ['Muelle Viejo', 'Carnada El Faro', 'Gasolinera Marea', 'Punta Serena', 'Embarcadero Sur', 'Sandbar Fuel'] },
    { number: '2003', name: 'Abarrotes del Llano', language: 'es', stores: ['Abarrotes Mezquite', 'Abarrotes Nopal', 'Abarrotes El Pozo', 'Cactus Flat Grocery', 'Abarrotes Huizache'] },
  ],
  towns: ['Puerto Claro', 'Bahía Serena', 'Punta Gaviota', 'Mezquital', 'Laguna Honda'],
  streets: ['Calle del Muelle', 'Avenida Marea', 'Camino del Faro', 'Calle Mezquite', 'Bayfront Road'],
  people: [
    { name: 'Lucía Barrera', email: 'lucia@puertoclaro.example', language: 'es', role: 'producer-admin' },
    { name: 'Tomás Rentería', email: 'tomas@puertoclaro.example', language: 'es', role: 'dispatcher' },
    { name: 'Elena Cantú', email: 'elena@puertoclaro.example', language: 'es', role: 'support-agent' },
    { name: 'Iris Calloway', email: 'iris@kestrelbend.example', language: 'en', role: 'support-agent' },
    { name: 'Raúl Ochoa', email: 'raul@puertoclaro.example', language: 'es', role: 'driver' },
    { name: 'Beto Salinas', email: 'beto@puertoclaro.example', language: 'es', role: 'technician' },
    { name: 'Carmen Villaseñor', email: 'carmen@puertoclaro.example', language: 'es', role: 'district-rep', district: 'Bahía' },
    { name: 'Inés Robledo', email: 'ines@lagaviota.example', language: 'es', role: 'store-manager', stores: ['La Gaviota 3'] },
    { name: 'Kyle Dorsey', email: 'kyle@sandbarfuel.example', language: 'en', role: 'store-manager', stores: ['Sandbar Fuel'] },
  ],
  layouts: { 'Carnada El Faro': [10, 20], 'La Gaviota 3': [7, 20], 'Sandbar Fuel': [7, 10] },
  unfitted: ['Gasolinera Marea'],
  newlyFitted: 'Punta Serena',
  troubles: {
    broken: 'La Gaviota 3',
    silent: 'Abarrotes Mezquite',
    short: 'Carnada El Faro',
    late: 'Muelle Viejo',
    morning: 'Abarrotes Nopal',
    hungry: 'Sandbar Fuel',
  },
};

export const demoProducers: DemoProducer[] = [kestrelBend, puertoClaro];
