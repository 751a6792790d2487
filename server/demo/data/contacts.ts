import type { Account } from '../../contract/accounts';

/** Invented people at each account, by its number; none of them uses the portal. */
export const contacts: Record<string, Account['contacts']> = {
  1001: [
    { name: 'Teresa Vance', work: 'Area manager', email: 'teresa@lanterncorner.example', phone: '(479) 555-0111' },
    { name: 'Garrett Poole', work: 'Buyer', email: 'garrett@lanterncorner.example', phone: '(479) 555-0112' },
    { name: 'Opal Brandt', work: 'Bookkeeper', email: 'invoices@lanterncorner.example', phone: '(479) 555-0113' },
  ],
  1002: [
    { name: 'Silas Harrow', work: 'Owner', email: 'silas@harrowmarlow.example', phone: '(870) 555-0121' },
    { name: 'June Tackett', work: 'Bookkeeper', email: 'june@harrowmarlow.example', phone: '(870) 555-0122' },
  ],
  1003: [
    { name: 'Della Whitcomb', work: 'Grocery buyer', email: 'della@ozarklane.example', phone: '(417) 555-0131' },
    { name: 'Amos Keller', work: 'Maintenance', email: 'amos@ozarklane.example', phone: '(417) 555-0132' },
    { name: 'Fern Abbott', work: 'Accounts payable', email: 'fern@ozarklane.example', phone: '(417) 555-0133' },
  ],
  1004: [
    { name: 'Hank Boone', work: 'Owner, Juniper Fuel & Bait', email: 'hank@juniperbait.example', phone: '(870) 555-0141' },
    { name: 'Lottie Crane', work: 'Owner, Tern Point Marina', email: 'lottie@ternpoint.example', phone: '(870) 555-0142' },
  ],
  2001: [
    { name: 'Amparo Solís', work: 'Compras', email: 'amparo@lagaviota.example', phone: '(361) 555-0171' },
    { name: 'Germán Lozano', work: 'Cuentas por pagar', email: 'german@lagaviota.example', phone: '(361) 555-0172' },
  ],
  2002: [
    { name: 'Nicolás Ibarra', work: 'Dueño', email: 'nicolas@delgolfo.example', phone: '(361) 555-0181' },
    { name: 'Rebeca Treviño', work: 'Contadora', email: 'rebeca@delgolfo.example', phone: '(361) 555-0182' },
    { name: 'Óscar Benavides', work: 'Mantenimiento', email: 'oscar@delgolfo.example', phone: '(361) 555-0183' },
  ],
  2003: [
    { name: 'Julia Montemayor', work: 'Dueña', email: 'julia@abarrotesllano.example', phone: '(361) 555-0191' },
    { name: 'Efraín Garza', work: 'Compras', email: 'efrain@abarrotesllano.example', phone: '(361) 555-0192' },
  ],
};
