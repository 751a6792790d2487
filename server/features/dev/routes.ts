import express, { type Response } from 'express';
import { api } from '../../contract';
import type { Mode } from '../../config';
import { desc, localMails, type Database } from '../../db';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { startSession } from '../../http/session';
import { escape } from '../mail/compose';
import { demoPeople } from './demo-people';

/** The doors for looking at local mail and signing in as somebody of the demo; never under `npm start`. */
export const hasDevDoors = (mode: Mode): boolean => mode !== 'production';

export const devRoutes = [
  route(api.dev.mailJson, ({ db }) =>
    mails(db).map(({ to, subject, text, html, at }) => ({ to, subject, text, html, links: linksIn(text), at: new Date(at).toISOString() })),
  ),

  route(api.dev.mail, ({ db }, { res }) => {
    const items = mails(db).map(
      ({ id, to, subject, at }) =>
        `<li><a href="/dev/mail/${id}">${escape(subject)}</a><br><small>${escape(to)} · ${new Date(at).toISOString()}</small></li>`,
    );
    return page(res, 'Local mail', items.length > 0 ? `<ol>${items.join('')}</ol>` : '<p>No mail yet.</p>');
  }),

  route(api.dev.mailOne, ({ db }, { params, res }) => {
    const mail = orNotFound(mails(db).find(({ id }) => id === params.mailId));
    const text = escape(mail.text).replace(/https?:\/\/[^\s<]+/g, (link) => `<a href="${link}">${link}</a>`);
    return page(res, mail.subject, `<p>${escape(mail.to)}</p><pre>${text}</pre><p><a href="/dev/mail">Local mail</a></p>`);
  }),

  route(api.dev.people, ({ db }, { query, res }) => {
    const people = demoPeople(db).filter(({ email }) => !query.email || email === query.email);
    const items = people.map(
      ({ email, name, role, producer }) => `<li><form method="post" action="/dev/people"><input type="hidden" name="email" value="${escape(email)}">
        <button>Sign in as ${escape(name)}</button> ${escape(role)}, ${escape(producer)}</form></li>`,
    );
    return page(res, 'Demo people', `<ul>${items.join('')}</ul>`);
  }),

  route(
    api.dev.signIn,
    async (services, { body, req, res }) => {
      const person = orNotFound(services.system.personByEmail(body.email));
      await startSession(services, req, person.id);
      res.redirect(303, '/');
      return undefined;
    },
    () => [express.urlencoded({ extended: false, limit: '2kb' })],
  ),
];

const mails = (db: Database) => db.select().from(localMails).orderBy(desc(localMails.at), desc(localMails.id)).limit(500).all();

const linksIn = (text: string): string[] => text.match(/https?:\/\/\S+/g) ?? [];

function page(res: Response, title: string, body: string): undefined {
  res.type('html').send(
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><title>${escape(title)}</title><link rel="stylesheet" href="/dev.css"></head><body><main><h1>${escape(title)}</h1>${body}</main></body></html>`,
  );
}
