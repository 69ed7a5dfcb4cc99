declare module '#app' {
  interface PageMeta {
    /** A form that has its own main button at the bottom: the bottom bar steps aside. */
    focused?: boolean
  }
}

export {}
