import { createContext, useContext } from 'react';

/** Whether the form around is on its way to the server. */
export const FormPending = createContext(false);

export const useFormPending = () => useContext(FormPending);
