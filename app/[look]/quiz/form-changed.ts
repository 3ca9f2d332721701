import { createContext, useContext } from 'react'

/** Tells the form that a field was changed by a script: a button beside it, or a slider. */
export const FormChanged = createContext<() => void>(() => {})
export const useFormChanged = () => useContext(FormChanged)
