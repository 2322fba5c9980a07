import { zodResolver } from "@hookform/resolvers/zod";
import { type Me, SignInRequest } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { Controller, useForm } from "react-hook-form";
import { View } from "react-native";
import { useSignIn } from "@/api/auth.ts";
import { Button } from "@/ui/Button.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Text } from "@/ui/Text.tsx";
import { TextField } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";

/** The session has ended while a page was open: sign in over it, so that nothing on the page is lost. */
export function SignInAgainDialog({ person }: { person: Me }) {
  const router = useRouter();
  const signIn = useSignIn(person.id);
  const { control, handleSubmit } = useForm({
    resolver: zodResolver(SignInRequest),
    defaultValues: { email: person.email, password: "" },
  });
  const submit = handleSubmit((request) => signIn.mutate(request));
  return (
    <Dialog title="Sign in again" onClose={() => router.replace("/")}>
      <DomForm onSubmit={submit} aria-label="Sign in again">
        <View style={{ gap: space.l }}>
          <Text>{`Your session has ended. What is on this page is kept; sign in as ${person.email} to go on.`}</Text>
          <Controller
            control={control}
            name="password"
            render={({ field, fieldState }) => (
              <TextField
                {...field}
                label="Password"
                type="password"
                autoComplete="current-password"
                autoFocus
                error={fieldState.error?.message}
              />
            )}
          />
          {signIn.error ? <ErrorState title="Not signed in" error={signIn.error} /> : null}
          <Button kind="primary" submit label="Sign in" busyLabel="Signing in…" busy={signIn.isPending} />
        </View>
      </DomForm>
    </Dialog>
  );
}
