import { zodResolver } from "@hookform/resolvers/zod";
import { SignUpRequest } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { useState } from "react";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import { useSignIn, useSignUp } from "@/api/auth.ts";
import { CautionList } from "@/features/cautions/index.ts";
import { spreadIssues } from "@/lib/formIssues.ts";
import { makeId } from "@/lib/ids.ts";
import { Button } from "@/ui/Button.tsx";
import { Checkbox } from "@/ui/Checkbox.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Link } from "@/ui/Link.tsx";
import { Page } from "@/ui/Page.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";

import { SignUpFields } from "./SignUpFields.tsx";

const FIELDS = ["name", "workshopName", "email", "password", "cautionsAcknowledged"] as const;

/** The form, with ids made once, so that sending it again after a lost answer makes no second workshop. */
function useSignUpForm() {
  const router = useRouter();
  const signUp = useSignUp();
  const signIn = useSignIn();
  const [ids] = useState(() => ({ personId: makeId(), workshopId: makeId() }));
  const form = useForm({
    resolver: zodResolver(SignUpRequest),
    defaultValues: { ...ids, name: "", workshopName: "", email: "", password: "" },
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      await signUp.mutateAsync(request);
    } catch (error) {
      spreadIssues(error, FIELDS, (name, message) => form.setError(name, { message }));
      return;
    }
    const { email, password } = request;
    // An address that had an account before keeps its old password, so this may fail: signing in then tells.
    await signIn.mutateAsync({ email, password }).then(
      () => router.replace("/builds"),
      () => router.replace({ pathname: "/sign-in", params: { email } }),
    );
  });
  return { form, submit, error: signUp.error, isBusy: signUp.isPending || signIn.isPending };
}

export function SignUpScreen() {
  const { form, submit, error, isBusy } = useSignUpForm();
  return (
    <Page
      title="Make a workshop"
      intro="A workshop holds your builds. You will be its owner and can work at once."
      width="reading"
    >
      <DomForm onSubmit={submit} aria-label="Make a workshop">
        <View style={styles.form}>
          <Panel title="You and your workshop">
            <SignUpFields control={form.control} />
          </Panel>
          <Panel title="Before you begin: the cautions">
            <CautionList />
            <Controller
              control={form.control}
              name="cautionsAcknowledged"
              render={({ field, fieldState }) => (
                <Checkbox
                  ref={field.ref}
                  onBlur={field.onBlur}
                  label="I have read these cautions and will keep to them"
                  isChecked={field.value === true}
                  onChange={(isChecked) => field.onChange(isChecked || undefined)}
                  error={fieldState.error?.message}
                />
              )}
            />
          </Panel>
          {error ? <ErrorState title="The workshop was not made" error={error} /> : null}
          <Button kind="primary" submit label="Make the workshop" busyLabel="Making it…" busy={isBusy} />
        </View>
      </DomForm>
      <Text>
        {"Already have one? "}
        <Link href="/sign-in">Sign in</Link>
      </Text>
    </Page>
  );
}

const styles = StyleSheet.create({ form: { gap: space.xl } });
