import { useTranslation } from 'react-i18next'
import { Outlet } from 'react-router-dom'
import { LanguageButton } from './language-button'
import { MainArea } from './main-area'
import { SkipLink } from './skip-link'
import { TopBar } from './top-bar'

/** Around the landowner's way in, before anybody is known. */
export function EntryShell() {
  const { t } = useTranslation()
  return (
    <>
      <SkipLink words={t('shell.skip')} />
      <TopBar>
        <LanguageButton />
      </TopBar>
      <MainArea>
        <Outlet />
      </MainArea>
    </>
  )
}
