import '@fontsource/source-sans-3/latin-300.css'
import '@fontsource/source-sans-3/latin-400.css'
import '@fontsource/source-sans-3/latin-600.css'
import 'element-plus/es/components/base/style/css'
import './styles/tokens.css'
import './styles/type.css'
import './styles/elementPlus.css'
import './styles/elementPlusFields.css'
import './styles/elementPlusPanels.css'
import './styles/sheet.css'
import './styles/table.css'
import './styles/drawing.css'
import './styles/print.css'
import { createPinia } from 'pinia'
import { createApp } from 'vue'
import App from './App.vue'
import { onUnauthenticated } from './api/http'
import { router } from './router'
import { useSessionStore } from './stores/session'

const app = createApp(App).use(createPinia())
const session = useSessionStore()

/** A session that has run out is renewed once; failing that, signing in leads back to the same sheet. */
onUnauthenticated(async () => {
  if (await session.renew()) return true
  session.forget()
  const { fullPath, name } = router.currentRoute.value
  if (name !== 'signIn') await router.push({ name: 'signIn', query: { next: fullPath, ended: '1' } })
  return false
})

app.use(router).mount('#app')
