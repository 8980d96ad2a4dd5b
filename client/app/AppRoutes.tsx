import { lazy } from "react";
import { Navigate, Route, Routes } from "react-router-dom";
import { Layout } from "./Layout";
import { NotFoundPage } from "./NotFoundPage";

// Each page is fetched when it is first opened.
const HomePage = lazy(async () => ({ default: (await import("../features/search/HomePage")).HomePage }));
const ResultsPage = lazy(async () => ({ default: (await import("../features/search/ResultsPage")).ResultsPage }));
const PartPage = lazy(async () => ({ default: (await import("../features/parts/PartPage")).PartPage }));
const FamilyListPage = lazy(async () => ({
  default: (await import("../features/families/FamilyListPage")).FamilyListPage,
}));
const FamilyPage = lazy(async () => ({ default: (await import("../features/families/FamilyPage")).FamilyPage }));
const WorkshopListPage = lazy(async () => ({
  default: (await import("../features/workshops/WorkshopListPage")).WorkshopListPage,
}));
const WorkshopPage = lazy(async () => ({
  default: (await import("../features/workshops/WorkshopPage")).WorkshopPage,
}));
const GuidesPage = lazy(async () => ({ default: (await import("../features/guides/GuidesPage")).GuidesPage }));
const GuidePage = lazy(async () => ({ default: (await import("../features/guides/GuidePage")).GuidePage }));
const SignInPage = lazy(async () => ({ default: (await import("../features/account/SignInPage")).SignInPage }));
const SignUpPage = lazy(async () => ({ default: (await import("../features/account/SignUpPage")).SignUpPage }));
const CheckMailPage = lazy(async () => ({
  default: (await import("../features/account/CheckMailPage")).CheckMailPage,
}));
const VerifyEmailPage = lazy(async () => ({
  default: (await import("../features/account/VerifyEmailPage")).VerifyEmailPage,
}));
const ForgotPasswordPage = lazy(async () => ({
  default: (await import("../features/account/ForgotPasswordPage")).ForgotPasswordPage,
}));
const ResetPasswordPage = lazy(async () => ({
  default: (await import("../features/account/ResetPasswordPage")).ResetPasswordPage,
}));
const AccountPage = lazy(async () => ({ default: (await import("../features/account/AccountPage")).AccountPage }));
const SignedIn = lazy(async () => ({ default: (await import("./SignedIn")).SignedIn }));
const SendVerification = lazy(async () => ({
  default: (await import("../features/account/SendVerification")).SendVerification,
}));
const BasketPage = lazy(async () => ({ default: (await import("../features/basket/BasketPage")).BasketPage }));
const CheckoutPage = lazy(async () => ({ default: (await import("../features/basket/CheckoutPage")).CheckoutPage }));
const OrdersPage = lazy(async () => ({ default: (await import("../features/orders/OrdersPage")).OrdersPage }));
const OrderPage = lazy(async () => ({ default: (await import("../features/orders/OrderPage")).OrderPage }));
const WorkshopOrdersPage = lazy(async () => ({
  default: (await import("../features/workshop-orders/WorkshopOrdersPage")).WorkshopOrdersPage,
}));
const WorkshopParcelPage = lazy(async () => ({
  default: (await import("../features/workshop-orders/WorkshopParcelPage")).WorkshopParcelPage,
}));
const WorkshopSettingsPage = lazy(async () => ({
  default: (await import("../features/workshop-settings/WorkshopSettingsPage")).WorkshopSettingsPage,
}));
const SpeedPage = lazy(async () => ({ default: (await import("../features/gauges/speed/SpeedPage")).SpeedPage }));
const BeltSamplePage = lazy(async () => ({
  default: (await import("../features/gauges/belt-sample/BeltSamplePage")).BeltSamplePage,
}));
const BeltRoutePage = lazy(async () => ({
  default: (await import("../features/gauges/belt-route/BeltRoutePage")).BeltRoutePage,
}));
const SheetsPage = lazy(async () => ({ default: (await import("../features/gauges/sheets/SheetsPage")).SheetsPage }));
const GaugeDeskPage = lazy(async () => ({ default: (await import("../features/gauges/GaugeDeskPage")).GaugeDeskPage }));
const TolerancesPage = lazy(async () => ({
  default: (await import("../features/gauges/tolerances/TolerancesPage")).TolerancesPage,
}));
const ORingsPage = lazy(async () => ({ default: (await import("../features/gauges/o-rings/ORingsPage")).ORingsPage }));

/**
 * Every address and its page. Declarative on purpose: the router with loaders weighs 18 kB more (gzip), and queries
 * start and keep what the pages need.
 */
export function AppRoutes() {
  return (
    <Routes>
      <Route element={<Layout hasStrip />}>
        <Route index element={<HomePage />} />
        <Route path="find" element={<ResultsPage />} />
        <Route path="parts/:id" element={<PartPage />} />
        <Route path="families" element={<FamilyListPage />} />
        <Route path="families/:slug" element={<FamilyPage />} />
        <Route path="workshops" element={<WorkshopListPage />} />
        <Route path="workshops/:slug" element={<WorkshopPage />} />
        <Route path="gauges/belt-sample" element={<BeltSamplePage />} />
        <Route path="gauges/speed" element={<SpeedPage />} />
        <Route path="gauges/belt-route" element={<BeltRoutePage />} />
        <Route path="gauges" element={<GaugeDeskPage />} />
        <Route path="gauges/tolerances" element={<TolerancesPage />} />
        <Route path="gauges/o-rings" element={<ORingsPage />} />
        <Route path="gauges/sheets" element={<SheetsPage />} />
        <Route path="guides" element={<GuidesPage />} />
        <Route path="guides/:slug" element={<GuidePage notFound={<NotFoundPage />} />} />
        <Route path="working" element={<Navigate to="/guides/fit-chance" replace />} />
      </Route>
      <Route element={<Layout />}>
        <Route path="sign-in" element={<SignInPage />} />
        <Route path="sign-up" element={<SignUpPage />} />
        <Route path="check-your-mail" element={<CheckMailPage />} />
        <Route path="verify-email" element={<VerifyEmailPage />} />
        <Route path="forgot-password" element={<ForgotPasswordPage />} />
        <Route path="reset-password" element={<ResetPasswordPage />} />
        <Route path="account" element={<AccountPage />} />
        <Route path="basket" element={<BasketPage />} />
        <Route element={<SignedIn />}>
          <Route path="checkout" element={<CheckoutPage sendVerification={<SendVerification />} />} />
          <Route path="orders" element={<OrdersPage />} />
          <Route path="orders/:id" element={<OrderPage />} />
          <Route path="workshop/settings" element={<WorkshopSettingsPage />} />
          <Route path="workshop/orders" element={<WorkshopOrdersPage />} />
          <Route path="workshop/orders/:id" element={<WorkshopParcelPage />} />
        </Route>
        <Route path="*" element={<NotFoundPage />} />
      </Route>
    </Routes>
  );
}
