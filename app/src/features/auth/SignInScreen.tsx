import { zodResolver } from "@hookform/resolvers/zod";
import { SignInRequest } from "@linkwright/contract";
import { type Href, useLocalSearchParams, useRouter } from "expo-router";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import { useSignIn } from "@/api/auth.ts";
import { Button } from "@/ui/Button.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Link } from "@/ui/Link.tsx";
import { Page } from "@/ui/Page.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Text } from "@/ui/Text.tsx";
import { TextField } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";

/** Only a path of our own: a link must not send a person elsewhere after signing in. */
function safeNext(next: string | undefined): Href {
  return (next && /^\/(?!\/)/.test(next) ? next : "/builds") as Href;
}

export function SignInScreen() {
  const router = useRouter();
  const { next, email } = useLocalSearchParams<{ next?: string; email?: string }>();
  const signIn = useSignIn();
  const { control, handleSubmit } = useForm({
    resolver: zodResolver(SignInRequest),
    defaultValues: { email: email ?? "", password: "" },
  });
  const submit = handleSubmit((request) =>
    signIn.mutateAsync(request).then(
      () => router.replace(safeNext(next)),
      () => undefined, // shown below from the mutation's own error
    ),
  );
  return (
    <Page title="Sign in" width="narrow">
      <Panel>
        <DomForm onSubmit={submit} aria-label="Sign in">
          <View style={styles.form}>
            <Controller
              control={control}
              name="email"
              render={({ field, fieldState }) => (
                <TextField
                  {...field}
                  label="E-mail address"
                  type="email"
                  autoComplete="username"
                  error={fieldState.error?.message}
                />
              )}
            />
            <Controller
              control={control}
              name="password"
              render={({ field, fieldState }) => (
                <TextField
                  {...field}
                  label="Password"
                  type="password"
                  autoComplete="current-password"
                  error={fieldState.error?.message}
                />
              )}
            />
            {signIn.error ? <ErrorState title="Not signed in" error={signIn.error} /> : null}
            <Button kind="primary" submit label="Sign in" busyLabel="Signing in…" busy={signIn.isPending} />
          </View>
        </DomForm>
      </Panel>
      <Text>
        {"New here? "}
        <Link href="/sign-up">Make a workshop</Link>
      </Text>
    </Page>
  );
}

const styles = StyleSheet.create({ form: { gap: space.l } });
