using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Documents;

public sealed class DocumentsTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task The_paper_is_served_byte_for_byte_to_its_holder_and_the_programme_and_to_nobody_else()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        var (_, document) = await world.Signed();
        foreach (var person in new[] { world.Trainee, world.Director })
        {
            using var visitor = await world.As(person);
            await visitor.Opens($"/documents/{document.Id}");
            Assert.Equal("application/pdf", visitor.Response.Content.Headers.ContentType!.MediaType);
            Assert.Equal(document.Bytes, await visitor.Response.Content.ReadAsByteArrayAsync());
        }
        foreach (var person in new[] { world.Reader, other.Director, other.Trainee })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/documents/{document.Id}")).Status);
        }
    }

    [Fact]
    public async Task The_whole_paper_satisfies_the_programs_of_strangers_and_never_shows_a_readers_words()
    {
        var world = await site.NewWorld();
        await world.Read();
        var (_, document) = await world.Signed();
        var file = Path.Combine(BlankSite.Folder, $"{document.Id}.pdf");
        await File.WriteAllBytesAsync(file, document.Bytes);
        var seal = Tool.Run("pdfsig", "-nocert", file).Output;
        Assert.Contains("Signature is Valid.", seal, StringComparison.Ordinal);
        Assert.Contains("Total document signed", seal, StringComparison.Ordinal);
        Assert.Contains("No syntax or stream encoding errors found", Tool.Run("qpdf", "--check", file).Output, StringComparison.Ordinal);
        var text = Tool.Run("pdftotext", "-raw", file, "-").Output;
        foreach (var fact in new[] { world.Trainee.Name, Granting.Privilege, world.Programme.Name, "1 scan performed, 1 read, 1 counted", "3 scans", "Test rules, version 1", world.Director.Name, "programme director", "Trained elsewhere before.", document.Code, "page 1 of 1", "local rules" })
            Assert.Contains(fact, text.ReplaceLineEndings(" "), StringComparison.Ordinal);
        Assert.DoesNotContain(World.Secret, text, StringComparison.Ordinal);
    }
}
