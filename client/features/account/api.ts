import { useMutation, useQueryClient } from "@tanstack/react-query";
import type {
  ChangePassword,
  RequestPasswordReset,
  ResetPassword,
  Session,
  SignIn,
  SignUp,
} from "#shared/schemas/session";
import { api, forgetToken, keepToken } from "../../lib/api";
import { sessionQuery } from "../../lib/session";

/** Signs in; everything that belonged to the visitor is fetched anew. */
export function useSignIn() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (body: SignIn) => api<Session>("/auth/sign-in", { method: "POST", body }),
    onSuccess: async (session) => {
      keepToken(session);
      queryClient.setQueryData(sessionQuery.queryKey, session);
      await queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
    },
  });
}

export function useSignOut() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: () => api<void>("/auth/sign-out", { method: "POST" }),
    onSuccess: async () => {
      forgetToken();
      queryClient.clear();
      await queryClient.fetchQuery(sessionQuery);
    },
  });
}

export const useSignUp = () =>
  useMutation({ mutationFn: (body: SignUp) => api<{ email: string }>("/auth/sign-up", { method: "POST", body }) });

export const useRequestReset = () =>
  useMutation({
    mutationFn: (body: RequestPasswordReset) => api<void>("/auth/request-password-reset", { method: "POST", body }),
  });

export const useResetPassword = () =>
  useMutation({ mutationFn: (body: ResetPassword) => api<void>("/auth/reset-password", { method: "POST", body }) });

export const useChangePassword = () =>
  useMutation({ mutationFn: (body: ChangePassword) => api<void>("/auth/change-password", { method: "POST", body }) });

export const useSignOutElsewhere = () =>
  useMutation({ mutationFn: () => api<void>("/auth/sign-out-everywhere", { method: "POST" }) });

export const useSendVerification = () =>
  useMutation({ mutationFn: () => api<void>("/auth/send-verification", { method: "POST" }) });

export function useVerifyEmail() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (token: string) => api<void>("/auth/verify-email", { method: "POST", body: { token } }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: sessionQuery.queryKey }),
  });
}
