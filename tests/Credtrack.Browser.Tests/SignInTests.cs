namespace Credtrack.Browser.Tests;

public sealed class SignInTests(Demonstration site)
{
    [Fact]
    public async Task A_password_is_not_shown_and_after_a_mistake_neither_kept()
    {
        await using var visitor = await site.Visit(Screen.Phone);
        await visitor.Opens("/sign-in");
        var password = visitor.Page.GetByLabel("Password", new() { Exact = true });
        await Expect(password).ToHaveAttributeAsync("type", "password");
        await visitor.Types("E-mail address", "wrenna.ostholm@demo.example");
        await visitor.Types("Password", "not this one");
        await visitor.Presses("Sign in");
        await Expect(visitor.Page.GetByRole(AriaRole.Alert)).ToContainTextAsync("do not belong together");
        await Expect(visitor.Page.GetByLabel("E-mail address")).ToHaveValueAsync("wrenna.ostholm@demo.example");
        await Expect(password).ToHaveValueAsync("");
    }
}
