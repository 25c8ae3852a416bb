import i18next from 'i18next'
import { initReactI18next } from 'react-i18next'
import { en } from './en'

export const languages = ['en', 'es'] as const
export type Language = (typeof languages)[number]

const KEPT = 'wadestone.language'

const keptLanguage = (): Language => {
  try {
    return localStorage.getItem(KEPT) === 'es' ? 'es' : 'en'
  } catch {
    return 'en'
  }
}

void i18next.use(initReactI18next).init({
  resources: { en: { translation: en } },
  lng: 'en',
  fallbackLng: 'en',
  interpolation: { escapeValue: false },
})

/** Other languages are fetched when somebody asks for them. */
export async function changeLanguage(language: Language): Promise<void> {
  if (language === 'es' && !i18next.hasResourceBundle('es', 'translation')) {
    const { es } = await import('./es')
    i18next.addResourceBundle('es', 'translation', es)
  }
  await i18next.changeLanguage(language)
  document.documentElement.lang = language
  try {
    localStorage.setItem(KEPT, language)
  } catch {
    // A browser that keeps nothing still shows the page in the language asked for.
  }
}

if (keptLanguage() === 'es') void changeLanguage('es')

export { i18next }
