import { Navigate, Route, Routes } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { lazyPage } from '#web/lib/lazy-page.ts';
import { NotFoundPage } from '#web/routes/not-found-page.tsx';
import { PantryLayout } from './pantry-layout.tsx';
import { StaffLayout } from './staff-layout.tsx';
import { StudioLayout } from './studio-layout.tsx';

const CalendarPage = lazyPage(
  async () => (await import('#web/routes/staff/calendar-page.tsx')).CalendarPage,
);
const OrdersPage = lazyPage(
  async () => (await import('#web/routes/staff/orders-page.tsx')).OrdersPage,
);
const StaffOrderPage = lazyPage(
  async () => (await import('#web/routes/staff/staff-order-page.tsx')).StaffOrderPage,
);
const SentMailPage = lazyPage(
  async () => (await import('#web/routes/staff/sent-mail-page.tsx')).SentMailPage,
);
const PeoplePage = lazyPage(
  async () => (await import('#web/routes/staff/people-page.tsx')).PeoplePage,
);
const FormulasPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/formulas-page.tsx')).FormulasPage,
);
const FormulaPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/formula-page.tsx')).FormulaPage,
);
const FormulaEditPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/formula-edit-page.tsx')).FormulaEditPage,
);
const FormulaNewPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/formula-new-page.tsx')).FormulaNewPage,
);
const IngredientsPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/ingredients-page.tsx')).IngredientsPage,
);
const IngredientPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/ingredient-page.tsx')).IngredientPage,
);
const EggsPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/eggs-page.tsx')).EggsPage,
);
const ShoppingPage = lazyPage(
  async () => (await import('#web/routes/staff/pantry/shopping-page.tsx')).ShoppingPage,
);
const KitchenSheetPage = lazyPage(
  async () => (await import('#web/routes/staff/kitchen-sheet-page.tsx')).KitchenSheetPage,
);
const PricesPage = lazyPage(
  async () => (await import('#web/routes/staff/prices-page.tsx')).PricesPage,
);
const AllergiesPage = lazyPage(
  async () => (await import('#web/routes/staff/allergies-page.tsx')).AllergiesPage,
);
const KitchenRulesPage = lazyPage(
  async () => (await import('#web/routes/staff/kitchen-rules-page.tsx')).KitchenRulesPage,
);
const MePage = lazyPage(async () => (await import('#web/routes/staff/me-page.tsx')).MePage);

/** The staff's addresses; loaded apart, so that no customer carries them. */
export function StaffRouter() {
  return (
    <Routes>
      <Route element={<StaffLayout />}>
        <Route index element={<Navigate to={paths.staffCalendar} replace />} />
        <Route path="calendar" element={<CalendarPage />} />
        <Route path="orders" element={<OrdersPage />} />
        <Route path="orders/:number" element={<StaffOrderPage />} />
        <Route path="orders/:number/kitchen" element={<KitchenSheetPage />} />
        <Route path="mail/:id" element={<SentMailPage />} />
        <Route path="pantry" element={<PantryLayout />}>
          <Route index element={<Navigate to={paths.staffFormulas} replace />} />
          <Route path="formulas" element={<FormulasPage />} />
          <Route path="formulas/new" element={<FormulaNewPage />} />
          <Route path="formulas/:id" element={<FormulaPage />} />
          <Route path="formulas/:id/edit" element={<FormulaEditPage />} />
          <Route path="ingredients" element={<IngredientsPage />} />
          <Route path="ingredients/new" element={<IngredientPage />} />
          <Route path="ingredients/:id" element={<IngredientPage />} />
          <Route path="eggs" element={<EggsPage />} />
          <Route path="shopping" element={<ShoppingPage />} />
        </Route>
        <Route path="studio" element={<StudioLayout />}>
          <Route index element={<PeoplePage />} />
          <Route path="prices" element={<PricesPage />} />
          <Route path="allergies" element={<AllergiesPage />} />
          <Route path="kitchen" element={<KitchenRulesPage />} />
        </Route>
        <Route path="me" element={<MePage />} />
        <Route path="*" element={<NotFoundPage />} />
      </Route>
    </Routes>
  );
}
