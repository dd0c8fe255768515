namespace Credtrack.Web.Plumbing.Mail;

/// <summary>Where no mail server is named: each letter is a file, which appears whole, in a folder that the program alone can read.</summary>
public sealed class FolderPost(MailSettings settings) : IPost
{
    public async Task<IReadOnlyCollection<Letter>> Send(IReadOnlyCollection<Letter> letters)
    {
        if (letters.Count > 0) SecretFile.Folder(settings.Folder);
        foreach (var letter in letters)
        {
            var (file, unfinished) = (Path.Combine(settings.Folder, $"{letter.Id}.eml"), Path.Combine(settings.Folder, $".{letter.Id}"));
            using (var message = letter.From(settings))
            using (var stream = SecretFile.New(unfinished)) await message.WriteToAsync(stream);
            File.Move(unfinished, file, overwrite: true);
        }
        return [];
    }
}
