import { lazy } from "react";
import { Route, Routes } from "react-router-dom";
import { Layout } from "./Layout";
import { NotFoundPage } from "./NotFoundPage";

// Each page is fetched when it is first opened.
const HomePage = lazy(async () => ({ default: (await import("../features/search/HomePage")).HomePage }));
const ResultsPage = lazy(async () => ({ default: (await import("../features/search/ResultsPage")).ResultsPage }));
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

/**
 * Every address and its page. Declarative on purpose: the router with loaders weighs 18 kB more (gzip), and queries
 * start and keep what the pages need.
 */
export function AppRoutes() {
  return (
    <Routes>
      <Route element={<Layout />}>
        <Route index element={<HomePage />} />
        <Route path="find" element={<ResultsPage />} />
        <Route path="sign-in" element={<SignInPage />} />
        <Route path="sign-up" element={<SignUpPage />} />
        <Route path="check-your-mail" element={<CheckMailPage />} />
        <Route path="verify-email" element={<VerifyEmailPage />} />
        <Route path="forgot-password" element={<ForgotPasswordPage />} />
        <Route path="reset-password" element={<ResetPasswordPage />} />
        <Route path="account" element={<AccountPage />} />
        <Route path="*" element={<NotFoundPage />} />
      </Route>
    </Routes>
  );
}
